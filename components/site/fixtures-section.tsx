'use client'
import { useState } from 'react'
import { v7 as newId } from 'uuid'
import { FIXTURE_KINDS, groundAt, type Fixture } from '@/lib/spacing'
import { HeightField, HeightsChoice } from './heights'
import { LengthField, OptionalLengthField } from './length-field'
import { useFresh, useMeasure, useThing } from './measure-context'
import { newFixture } from './new-things'
import { ActionButton, ChoiceField, NotKept, EmptySection, FieldGrid, Row, Section } from './parts'

export const FIXTURE_WORDS: Record<Fixture['kind'], string> = {
  'electric-meter': 'Electric meter', 'gas-meter': 'Gas meter', condenser: 'Condenser', 'hose-bib': 'Hose bib', vent: 'Vent',
  downspout: 'Downspout', 'house-number': 'House number', 'entry-light': 'Entry light', 'escape-well': 'Escape well',
}

function FixtureRow({ id, count, onCopy, onRemove }: { id: string; count: number; onCopy: (fixture: Fixture) => void; onRemove: (fixture: Fixture) => void }) {
  const { units, readOnly, state } = useMeasure()
  const { value: fixture, type, choose, leave, problemAt, elsewhere, putBack } = useThing('fixture', id)
  const title = `${count}. ${FIXTURE_WORDS[fixture.kind]}`
  const soil = groundAt(state.shown.facade, fixture.x + fixture.width / 2, fixture.y + fixture.depth)
  const length = (label: string, field: 'x' | 'y' | 'width' | 'depth' | 'height') => (
    <LengthField
      label={label}
      longLabel={`${title}, ${label.toLowerCase()}`}
      units={units}
      readOnly={readOnly}
      value={fixture[field]}
      problem={problemAt(field)}
      onValue={(inches) => type({ [field]: inches })}
      onLeave={leave}
    />
  )
  return (
    <Row title={title} onCopy={() => onCopy(fixture)} onRemove={() => onRemove(fixture)} readOnly={readOnly}>
      <FieldGrid columns={2}>
        <ChoiceField label="Kind" longLabel={`${title}, kind`} value={fixture.kind} choices={FIXTURE_KINDS} words={FIXTURE_WORDS} readOnly={readOnly} onChoice={(kind) => choose({ kind })} />
        {fixture.kind === 'downspout' ? (
          <OptionalLengthField label="Water leaves, from the wall" longLabel={`${title}, water leaves, from the wall`} units={units} readOnly={readOnly} value={fixture.outlet} problem={problemAt('outlet')} onValue={(outlet) => type({ outlet })} onLeave={leave} />
        ) : null}
      </FieldGrid>
      <FieldGrid columns={3}>
        {length('Left edge', 'x')}
        {length('Width', 'width')}
        {length('Back, out from base line', 'y')}
        {length('Depth', 'depth')}
        <HeightField label="Lower edge" longLabel={`${title}, lower edge`} value={fixture.z} soil={soil} problem={problemAt('z')} onValue={(z) => type({ z })} onLeave={leave} />
        {length('Height of it', 'height')}
      </FieldGrid>
      <NotKept messages={elsewhere} onPutBack={putBack} />
    </Row>
  )
}

/** What must stay reachable or visible. */
export function FixturesSection() {
  const { measuring, state, readOnly } = useMeasure()
  const { fresh, setFresh, focusRef } = useFresh()
  const [kind, setKind] = useState<Fixture['kind']>('electric-meter')
  const { fixtures } = state.sheet
  const put = (value: Fixture, deed: string) => {
    if (measuring.put({ kind: 'fixture', value }, `${FIXTURE_WORDS[value.kind]} ${deed}`).length === 0) setFresh(value.id)
  }
  return (
    <Section id="fixtures" title="Fixtures" lead="What must stay reachable or visible: meters, condenser, taps, vents, downspouts, house number, lights, escape wells.">
      <HeightsChoice />
      {fixtures.length === 0 ? <EmptySection>Fixtures on and before the wall stand here, so that plants keep clear of them.</EmptySection> : null}
      <ul className="space-y-4">
        {fixtures.map(({ id }, i) => (
          <li key={id} ref={id === fresh ? focusRef : undefined}>
            <FixtureRow
              id={id}
              count={i + 1}
              onCopy={(fixture) => put({ ...fixture, id: newId(), x: fixture.x + fixture.width + 12 }, 'copied')}
              onRemove={(value) => measuring.remove({ kind: 'fixture', value })}
            />
          </li>
        ))}
      </ul>
      {readOnly ? null : (
        <div className="mt-4 flex flex-wrap items-end gap-2">
          <ChoiceField label="New fixture" value={kind} choices={FIXTURE_KINDS} words={FIXTURE_WORDS} readOnly={false} onChoice={setKind} />
          <ActionButton kind="plain" onPress={() => put(newFixture(state.sheet, kind, newId()), 'added')}>Add fixture</ActionButton>
        </div>
      )}
    </Section>
  )
}
