'use client'
/** Words and filters of the library as a form that works with and without JavaScript: an address says it all. */
import Form from 'next/form'
import type { Route } from 'next'
import Link from 'next/link'
import { useEffect, useRef } from 'react'
import { Button, SelectField, TextField } from '@/components/ui'
import {
  BLOOM_FILTERS, CATEGORIES, DEER_CLASSES, DEER_WORDS, FOLIAGE_COLORS, isNarrowed, LEAVES, LIGHTS, plantQueryText, wordOf,
  type PlantQuery, type QueryProblem,
} from '@/lib/plants'
import { formatLength } from '@/lib/measure'

type Choices = readonly (readonly [value: string, word: string])[]

const wordsOf = (values: readonly string[]): Choices => values.map((value) => [value, wordOf(value)] as const)
const LEAF_CHOICES: Choices = [['evergreen', 'Any evergreen'], ...wordsOf(LEAVES)]
const DEER_CHOICES: Choices = DEER_CLASSES.map((deer) => [deer, deer === 'rarely' || deer === 'unknown' ? DEER_WORDS[deer] : `${DEER_WORDS[deer]} or less`] as const)
const OWNER_CHOICES: Choices = [['shared', 'Shared library'], ['own', 'Our own']]

function Choice({ name, label, value, choices }: { name: string; label: string; value: string; choices: Choices }) {
  const options = [{ value: '', label: 'Any' }, ...choices.map(([choice, word]) => ({ value: choice, label: word }))]
  return <SelectField name={name} label={label} defaultValue={value} data-asked={value} options={options} />
}

interface EntryProps {
  name: string
  label: string
  value: string
  hint?: string
  problem?: string | undefined
  type?: 'text' | 'search'
}

function Entry({ name, label, value, hint, problem, type = 'text' }: EntryProps) {
  return <TextField name={name} type={type} label={label} hint={hint} error={problem} defaultValue={value} data-asked={value} autoComplete="off" />
}

/** Going back or clearing shows another query: the controls follow the address, keeping the focus where it is. */
function useAsked(text: string) {
  const form = useRef<HTMLFormElement>(null)
  useEffect(() => {
    for (const control of form.current?.elements ?? []) {
      if ((control instanceof HTMLInputElement || control instanceof HTMLSelectElement) && control.dataset.asked !== undefined) control.value = control.dataset.asked
    }
  }, [text])
  return form
}

interface Props {
  query: PlantQuery
  problems: QueryProblem[]
  /** What was typed, as it was typed: kept when it cannot be read. */
  typed: Partial<Record<string, string>>
}

export function PlantFilters({ query, problems, typed }: Props) {
  const text = plantQueryText(query)
  const form = useAsked(`${text} ${problems.length}`)
  const problemOf = (field: string) => problems.find((problem) => problem.field === field)?.message
  const lengthOf = (field: 'heightMax' | 'spreadMax') => typed[field] ?? (query[field] === null ? '' : formatLength(query[field]))
  return (
    <Form ref={form} action="/plants" role="search" aria-label="Plants" className="rounded-sm border border-rule bg-sheet p-4">
      <div className="grid grid-cols-2 gap-3 md:grid-cols-4 xl:grid-cols-6">
        <div className="col-span-2">
          <Entry name="q" type="search" label="Name" hint="Beginnings of words, botanical or common: ilex gla" value={query.q} />
        </div>
        <Choice name="category" label="Type" value={query.category} choices={wordsOf(CATEGORIES)} />
        <Choice name="leaf" label="Leaf" value={query.leaf} choices={LEAF_CHOICES} />
        <Entry name="heightMax" label="Height at most" hint="48, or 4 ft" value={lengthOf('heightMax')} problem={problemOf('heightMax')} />
        <Entry name="spreadMax" label="Spread at most" hint="36, or 3 ft" value={lengthOf('spreadMax')} problem={problemOf('spreadMax')} />
        <Entry name="zone" label="Hardy in zone" hint="6, or 6b" value={typed.zone ?? (query.zone === null ? '' : String(query.zone))} problem={problemOf('zone')} />
        <Choice name="light" label="Light" value={query.light} choices={wordsOf(LIGHTS)} />
        <Choice name="deer" label="Deer" value={query.deer} choices={DEER_CHOICES} />
        <Choice name="foliageColor" label="Foliage" value={query.foliageColor} choices={wordsOf(FOLIAGE_COLORS)} />
        <Choice name="bloomColor" label="Flower" value={query.bloomColor} choices={wordsOf(BLOOM_FILTERS)} />
        <Choice name="owner" label="Whose" value={query.owner} choices={OWNER_CHOICES} />
      </div>
      {query.sort !== 'match' && <input type="hidden" name="sort" value={query.sort} />}
      {query.direction !== 'asc' && <input type="hidden" name="direction" value={query.direction} />}
      <div className="mt-3 flex flex-wrap items-center gap-3">
        <Button type="submit" variant="primary">Show plants</Button>
        {(isNarrowed(query) || problems.length > 0) && (
          <Link href={'/plants' as Route} className="inline-flex min-h-11 items-center px-2 underline underline-offset-4">Clear all filters</Link>
        )}
      </div>
    </Form>
  )
}
