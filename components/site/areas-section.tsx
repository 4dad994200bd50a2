'use client'
import { useState } from 'react'
import { v7 as newId } from 'uuid'
import { outlineOf, rectangleOf, type Rectangle } from '@/lib/sheet'
import type { Bed, Point, Walk } from '@/lib/spacing'
import { LengthField } from './length-field'
import { useFresh, useMeasure, useThing } from './measure-context'
import { nameOfCopy, newBed, newWalk } from './new-things'
import { ActionButton, Choice, NotKept, EmptySection, FieldGrid, NameField, Row, Section } from './parts'
import { PointRows } from './point-rows'

interface OutlineProps {
  name: string
  onType: (outline: Point[]) => void
  onLeave: () => void
}

const SIDES = [
  { side: 'fromX', label: 'From x' },
  { side: 'toX', label: 'To x' },
  { side: 'fromY', label: 'From out' },
  { side: 'toY', label: 'To out' },
] as const

/** Four numbers; a pair that stands the wrong way round waits with its reason and changes nothing. */
function RectangleFields({ name, rectangle, onType, onLeave }: OutlineProps & { rectangle: Rectangle }) {
  const { units, readOnly } = useMeasure()
  const [typed, setTyped] = useState<Partial<Rectangle>>({})
  const wanted = { ...rectangle, ...typed }
  const problems = {
    toX: wanted.toX <= wanted.fromX ? 'It must end farther right than it starts.' : null,
    toY: wanted.toY <= wanted.fromY ? 'It must end farther out than it starts.' : null,
  }
  const change = (side: keyof Rectangle, inches: number) => {
    const next = { ...wanted, [side]: inches }
    const isSound = next.toX > next.fromX && next.toY > next.fromY
    setTyped(isSound ? {} : { ...typed, [side]: inches })
    if (isSound) onType(outlineOf(next))
  }
  return (
    <FieldGrid columns={4}>
      {SIDES.map(({ side, label }) => (
        <LengthField
          key={side}
          label={label}
          longLabel={`${name}, ${label.toLowerCase()}`}
          units={units}
          readOnly={readOnly}
          value={wanted[side]}
          problem={side === 'toX' ? problems.toX : side === 'toY' ? problems.toY : null}
          onValue={(inches) => change(side, inches)}
          onLeave={onLeave}
        />
      ))}
    </FieldGrid>
  )
}

interface AreaProps {
  kind: 'walk' | 'bed'
  id: string
  onCopy: (area: Walk | Bed) => void
  onRemove: (area: Walk | Bed) => void
}

const WAYS = { rectangle: 'four numbers', points: 'its corners' } as const

function AreaRow({ kind, id, onCopy, onRemove }: AreaProps) {
  const { readOnly } = useMeasure()
  const { value: area, type, choose, leave, problemAt, elsewhere, putBack } = useThing(kind, id)
  const [way, setWay] = useState<keyof typeof WAYS>('rectangle')
  const rectangle = rectangleOf(area.outline)
  return (
    <Row title={area.name} onCopy={() => onCopy(area)} onRemove={() => onRemove(area)} readOnly={readOnly}>
      <FieldGrid columns={2}>
        <NameField longLabel={`${area.name}, name`} value={area.name} problem={problemAt('name')} readOnly={readOnly} onValue={(name) => type({ name })} onLeave={leave} />
      </FieldGrid>
      {rectangle ? <Choice label={`${area.name} by`} value={way} choices={['rectangle', 'points']} words={WAYS} onChoice={setWay} /> : null}
      {rectangle && way === 'rectangle' ? (
        <RectangleFields name={area.name} rectangle={rectangle} onType={(outline) => type({ outline })} onLeave={leave} />
      ) : (
        <PointRows
          points={area.outline}
          least={3}
          what={`${area.name} corner`}
          problemAt={(i, axis) => problemAt('outline', i, axis)}
          onType={(outline) => type({ outline })}
          onChoose={(outline) => choose({ outline })}
          onLeave={leave}
        />
      )}
      <NotKept messages={elsewhere} onPutBack={putBack}>{problemAt('outline')}</NotKept>
    </Row>
  )
}

const TEXTS = {
  walk: { id: 'walks', title: 'Walks', lead: 'Paved strips that must stay clear. Out is measured from the base line of the wall.', empty: 'Walks stand here: plants that lean over their edge are found.', add: 'Add a walk' },
  bed: { id: 'beds', title: 'Beds', lead: 'The ground that may be planted.', empty: 'Beds stand here: a plant outside all of them is found.', add: 'Add a bed' },
} as const

/** Walks or beds: each by four numbers where it is square to the wall, by its corners otherwise. */
export function AreasSection({ kind }: { kind: 'walk' | 'bed' }) {
  const { measuring, state, readOnly } = useMeasure()
  const { fresh, setFresh, focusRef } = useFresh()
  const areas = kind === 'walk' ? state.sheet.walks : state.sheet.beds
  const { id: sectionId, title, lead, empty, add } = TEXTS[kind]
  const put = (value: Walk | Bed, label: string) => {
    if (measuring.put({ kind, value }, label).length === 0) setFresh(value.id)
  }
  const addNew = () => {
    const value = kind === 'walk' ? newWalk(state.sheet, newId()) : newBed(state.sheet, newId())
    put(value, `${value.name} added`)
  }
  return (
    <Section id={sectionId} title={title} lead={lead}>
      {areas.length === 0 ? <EmptySection>{empty}</EmptySection> : null}
      <ul className="space-y-4">
        {areas.map(({ id }) => (
          <li key={id} ref={id === fresh ? focusRef : undefined}>
            <AreaRow
              kind={kind}
              id={id}
              onCopy={(area) => put({ ...area, id: newId(), name: nameOfCopy(area, areas) }, `${area.name} copied`)}
              onRemove={(value) => measuring.remove({ kind, value })}
            />
          </li>
        ))}
      </ul>
      {readOnly ? null : <div className="mt-4"><ActionButton kind="plain" onPress={addNew}>{add}</ActionButton></div>}
    </Section>
  )
}
