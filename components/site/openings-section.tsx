'use client'
import { v7 as newId } from 'uuid'
import { OPENING_KINDS, gradeAt, type Opening } from '@/lib/spacing'
import { HeightField, HeightsChoice } from './heights'
import { LengthField } from './length-field'
import { useFresh, useMeasure, useThing } from './measure-context'
import { copyOfOpening, newOpening } from './new-things'
import { ActionButton, ChoiceField, NotKept, EmptySection, FieldGrid, NameField, Row, Section } from './parts'

const KIND_WORDS = { window: 'Window', door: 'Door' } as const

function OpeningRow({ id, onCopy, onRemove }: { id: string; onCopy: (opening: Opening) => void; onRemove: (opening: Opening) => void }) {
  const { units, readOnly, state } = useMeasure()
  const { value: opening, type, choose, leave, problemAt, elsewhere, putBack } = useThing('opening', id)
  const { name, x, width } = opening
  const soil = gradeAt(state.shown.facade, x + width / 2)
  const shared = { units, readOnly, onLeave: leave }
  return (
    <Row title={name} onCopy={() => onCopy(opening)} onRemove={() => onRemove(opening)} readOnly={readOnly}>
      <FieldGrid columns={2}>
        <NameField longLabel={`${name}, name`} value={name} problem={problemAt('name')} readOnly={readOnly} onValue={(next) => type({ name: next })} onLeave={leave} />
        <ChoiceField label="Kind" longLabel={`${name}, kind`} value={opening.kind} choices={OPENING_KINDS} words={KIND_WORDS} readOnly={readOnly} onChoice={(kind) => choose({ kind })} />
      </FieldGrid>
      <FieldGrid columns={4}>
        <LengthField {...shared} label="Left edge" longLabel={`${name}, left edge`} value={x} problem={problemAt('x')} onValue={(next) => type({ x: next })} />
        <LengthField {...shared} label="Width" longLabel={`${name}, width`} value={width} problem={problemAt('width')} onValue={(next) => type({ width: next })} />
        <HeightField label="Sill" longLabel={`${name}, sill`} value={opening.sill} soil={soil} problem={problemAt('sill')} onValue={(sill) => type({ sill })} onLeave={leave} />
        <HeightField label="Head" longLabel={`${name}, head`} value={opening.head} soil={soil} problem={problemAt('head')} onValue={(head) => type({ head })} onLeave={leave} />
      </FieldGrid>
      <NotKept messages={elsewhere} onPutBack={putBack} />
    </Row>
  )
}

/** Windows and doors. */
export function OpeningsSection() {
  const { measuring, state, readOnly } = useMeasure()
  const { fresh, setFresh, focusRef } = useFresh()
  const { openings } = state.sheet
  const put = (value: Opening, label: string) => {
    if (measuring.put({ kind: 'opening', value }, label).length === 0) setFresh(value.id)
  }
  const add = (kind: Opening['kind']) => {
    const value = newOpening(state.sheet, kind, newId())
    put(value, `${value.name} added`)
  }
  return (
    <Section id="openings" title="Windows and doors" lead="Left edge from the zero of x; sill and head are the lower and upper edge of the glass, or of the door.">
      <HeightsChoice />
      {openings.length === 0 ? <EmptySection>Windows and doors of this house front stand here: a plant may not grow over a sill.</EmptySection> : null}
      <ul className="space-y-4">
        {openings.map(({ id }) => (
          <li key={id} ref={id === fresh ? focusRef : undefined}>
            <OpeningRow
              id={id}
              onCopy={(opening) => put(copyOfOpening(state.sheet, opening, newId()), `${opening.name} copied`)}
              onRemove={(value) => measuring.remove({ kind: 'opening', value })}
            />
          </li>
        ))}
      </ul>
      {readOnly ? null : (
        <div className="mt-4 flex flex-wrap gap-2">
          <ActionButton kind="plain" onPress={() => add('window')}>Add a window</ActionButton>
          <ActionButton kind="plain" onPress={() => add('door')}>Add a door</ActionButton>
        </div>
      )}
    </Section>
  )
}
