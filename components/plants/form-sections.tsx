'use client'
/** The plant form, part by part. */
import type { ReactNode } from 'react'
import { useFieldArray, useFormContext, useWatch } from 'react-hook-form'
import { Button } from '@/components/ui'
import {
  BIRD_VALUES, BLOOM_COLORS, CATEGORIES, DEER_CLASSES, DEER_WORDS, FACT_LABELS, FACTS, FALL_COLORS, FOLIAGE_COLORS, GROWTHS, HABITS,
  JUGLONES, LEAVES, LIGHTS, NATIVE_REGIONS, PRUNES, TEXTURES, TOXICITIES, WATERS, type Fact, type PlantFormValues,
} from '@/lib/plants'
import { FormChoices, FormMonths, FormSelect, FormText, FormYesNo } from './form-fields'
import { CARD, HEADING } from './parts'

function Section({ title, lead, children }: { title: string; lead?: string; children: ReactNode }) {
  return (
    <section className={CARD} aria-label={title}>
      <h2 className={HEADING}>{title}</h2>
      {lead && <p className="mb-2 max-w-prose text-ink-soft">{lead}</p>}
      <div className="mt-2 grid gap-4">{children}</div>
    </section>
  )
}

const Row = ({ children }: { children: ReactNode }) => <div className="grid grid-cols-2 items-start gap-3 md:grid-cols-4">{children}</div>

export function NameSection() {
  return (
    <Section title="Name">
      <div className="grid gap-3 md:grid-cols-2">
        <FormText name="botanical" label="Botanical name" hint="A cultivar in single quotation marks: Ilex glabra 'Shamrock'" />
        <FormText name="common" label="Common name" />
      </div>
      <Row>
        <FormSelect name="category" label="Type" values={CATEGORIES} />
        <FormSelect name="leaf" label="Leaf" values={LEAVES} />
      </Row>
    </Section>
  )
}

export function SizeSection() {
  return (
    <Section title="Size when full grown" lead="Every judgement about a bed rests on these. Give the range on record; where one figure is printed, give it twice.">
      <Row>
        <FormText name="heightMin" label="Smallest height" hint="36, 3 ft or 3'-0&quot;" />
        <FormText name="heightMax" label="Largest height" />
        <FormText name="spreadMin" label="Smallest spread" />
        <FormText name="spreadMax" label="Largest spread" />
      </Row>
      <Row>
        <FormSelect name="habit" label="Habit" values={HABITS} />
        <FormSelect name="growth" label="Growth" values={GROWTHS} />
        <FormSelect name="texture" label="Texture" values={TEXTURES} />
        <FormSelect name="prune" label="Pruning" values={PRUNES} words={{ none: 'None' }} />
      </Row>
    </Section>
  )
}

export function PlaceSection() {
  return (
    <Section title="Where it grows">
      <Row>
        <FormText name="zoneMin" label="Coldest zone" hint="1 to 13; empty if grown for one season" />
        <FormText name="zoneMax" label="Warmest zone" />
        <FormSelect name="deer" label="Deer" values={DEER_CLASSES} words={DEER_WORDS} />
        <FormSelect name="juglone" label="Near walnut" values={JUGLONES} words={{ unknown: 'Not known' }} />
      </Row>
      <FormChoices name="light" legend="Light" values={LIGHTS} />
      <FormChoices name="water" legend="Soil moisture" values={WATERS} />
      <FormChoices name="native" legend="Native to" values={NATIVE_REGIONS} />
      <FormChoices name="birds" legend="For birds" values={BIRD_VALUES} />
    </Section>
  )
}

export function YearSection() {
  return (
    <Section title="Through the year">
      <Row>
        <FormSelect name="foliageColor" label="Foliage color" values={FOLIAGE_COLORS} />
        <FormSelect name="fallColor" label="Fall color" values={FALL_COLORS} words={{ none: 'None of note', multi: 'Several colors' }} />
        <FormSelect name="bloomColor" label="Flower color" values={BLOOM_COLORS} words={{ '': 'None of note', multi: 'Several colors' }} />
        <FormText name="fruitColor" label="Fruit color" hint="Empty if none of note" />
      </Row>
      <FormMonths name="bloomMonths" legend="In flower" />
      <FormMonths name="fruitMonths" legend="In fruit" />
    </Section>
  )
}

export function CautionSection() {
  return (
    <Section title="Cautions" lead="Not being on a list is no proof that a plant is harmless.">
      <Row><FormSelect name="toxicity" label="Toxicity" values={TOXICITIES} words={{ unlisted: 'Not listed', irritant: 'Listed as an irritant', toxic: 'Listed as toxic' }} /></Row>
      <div className="flex flex-wrap gap-3">
        <FormYesNo name="thorns" label="Has thorns, spines or prickles" />
        <FormYesNo name="invasive" label="Listed as invasive somewhere in the United States" />
      </div>
    </Section>
  )
}

const factWord = (fact: string) => FACT_LABELS[fact as Fact]

export function SourceSection() {
  const { control } = useFormContext<PlantFormValues>()
  const { fields, append, remove } = useFieldArray({ control, name: 'sources' })
  const hasSources = (useWatch({ control, name: 'sources' }) ?? []).length > 0
  return (
    <Section title="Where this was read" lead="Without a source the plant’s page says of every fact that it is from memory.">
      {fields.map((field, i) => (
        <div key={field.id} role="group" aria-label={`Source ${i + 1}`} className="grid gap-3 border-t border-rule pt-3 md:grid-cols-[1fr_1fr_auto] md:items-start">
          <FormText name={`sources.${i}.title`} label="Title" hint="Who published it, and what" />
          <FormText name={`sources.${i}.url`} label="Address" hint="https://, or empty for print" />
          <Button className="md:mt-7" onClick={() => remove(i)}>Remove source {i + 1}</Button>
        </div>
      ))}
      <div><Button disabled={fields.length >= 12} onClick={() => append({ title: '', url: '' })}>Add a source</Button></div>
      {hasSources && <FormChoices name="memoryFacts" legend="Not read there, but from memory" values={FACTS} word={factWord} />}
    </Section>
  )
}
