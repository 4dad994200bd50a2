'use client'
/** What a spot can hold: the largest crown there, the plants that fit it, and those that just miss. */
import { useMutation } from '@tanstack/react-query'
import { useEffect, useState } from 'react'
import { LengthField } from '@/components/site/length-field'
import { formatLength } from '@/lib/measure'
import { rangeText, type Plant } from '@/lib/plants'
import { describeMiss, wallDistance, type Fit, type NearMiss, type Sheet, type Size } from '@/lib/spacing'
import { ask } from './calls'
import { useDesk, useEditorState } from './desk-context'
import { outFromWall } from './editor'
import { PLAIN, QUIET, STRONG } from './parts'

interface FitsAnswer {
  largest: Size | null
  fits: Fit[]
  total: number
  misses: NearMiss[]
  plants: Plant[]
}

interface Spot {
  x: number
  y: number
}

async function askFits(facadeId: string, spot: Spot): Promise<FitsAnswer> {
  const answer = await ask<FitsAnswer>(`/api/facades/${encodeURIComponent(facadeId)}/fits`, { method: 'POST', headers: { 'content-type': 'application/json' }, body: JSON.stringify(spot) })
  if (!answer.ok) throw new Error(answer.message)
  return answer.value
}

const sizeText = ({ height, spread }: Size) => `${formatLength(height)} high and ${formatLength(spread)} across`

/** Crowns of another habit, or that may overlap more, come to more than the mounded one. */
const fillText = (fill: number) => (fill >= 0.95 ? 'fills the room' : `fills ${Math.round(fill * 100)} percent of the room`)

function PlantLine({ plant, children }: { plant: Plant; children?: React.ReactNode }) {
  return (
    <span className="min-w-0 flex-1">
      <span className="block font-heading text-lg leading-tight italic">{plant.botanical}</span>
      <span className="block">{plant.common}</span>
      <span className="block font-mono text-sm text-ink-soft">{rangeText(plant.heightMin, plant.heightMax)} tall, {rangeText(plant.spreadMin, plant.spreadMax)} across</span>
      {children}
    </span>
  )
}

function Answered({ answer, spot, sheet }: { answer: FitsAnswer; spot: Spot; sheet: Sheet }) {
  const { editor } = useDesk()
  const plants = new Map(answer.plants.map((plant) => [plant.id, plant]))
  const named = <T extends { plant: string }>(things: readonly T[]) => things.flatMap((thing) => { const plant = plants.get(thing.plant); return plant ? [{ ...thing, plant }] : [] })
  return (
    <>
      <p role="status" className="px-4 py-2">
        {answer.largest ? <><strong>Holds a crown up to {sizeText(answer.largest)}.</strong> {answer.total === 0 ? 'No plant of the library fits it.' : `${answer.total} plants of the library fit.`}</> : <strong>Nothing can stand here without a conflict.</strong>}
      </p>
      <ul>
        {named(answer.fits).map(({ plant, fill }) => (
          <li key={plant.id} className="flex items-center gap-2 border-b border-rule px-4 py-2">
            <PlantLine plant={plant}><span className="block text-sm text-ink-soft">{fillText(fill)}</span></PlantLine>
            {editor.canEdit ? <button type="button" className={PLAIN} aria-label={`Plant ${plant.botanical} here`} onClick={() => editor.add(plant, spot.x, spot.y)}>Plant</button> : null}
          </li>
        ))}
      </ul>
      {answer.misses.length > 0 ? (
        <>
          <h3 className="px-4 pt-4 font-heading text-lg">Just too large</h3>
          <ul>
            {named(answer.misses).map(({ plant, finding }) => (
              <li key={plant.id} className="border-b border-rule px-4 py-2"><PlantLine plant={plant}><span className="block">{describeMiss(finding, sheet)}</span></PlantLine></li>
            ))}
          </ul>
        </>
      ) : null}
    </>
  )
}

/** The spot by numbers: for those who do not tap. */
function ByNumbers({ onSpot }: { onSpot: (spot: Spot) => void }) {
  const { sheet, spot } = useEditorState()
  const { wall } = sheet.facade
  const [typed, setTyped] = useState<{ x: number; out: number } | null>(null)
  const shown = typed ?? (spot ? { x: spot.x, out: wallDistance(sheet.facade, spot.x, spot.y) } : { x: Math.round((wall[0]!.x + wall.at(-1)!.x) / 2), out: 36 })
  return (
    <form
      className="grid grid-cols-2 gap-3 px-4 pb-3"
      onSubmit={(event) => {
        event.preventDefault()
        setTyped(null)
        onSpot({ x: shown.x, y: outFromWall(sheet.facade, shown.x, shown.out) })
      }}
    >
      <LengthField label="Along the wall" units="imperial" value={shown.x} onValue={(x) => setTyped({ ...shown, x })} />
      <LengthField label="From the wall" units="imperial" value={shown.out} onValue={(out) => setTyped({ ...shown, out })} />
      <button type="submit" className={`${STRONG} col-span-2`}>What fits there?</button>
    </form>
  )
}

export function RoomPanel({ facadeId, onClose }: { facadeId: string; onClose: () => void }) {
  const { editor } = useDesk()
  const { sheet, spot } = useEditorState()
  const { mutate, data, error, isPending, reset } = useMutation({ mutationFn: (asked: Spot) => askFits(facadeId, asked), onSuccess: ({ largest }) => editor.showRoom(largest) })
  const [x, y] = [spot?.x, spot?.y]
  useEffect(() => {
    if (x === undefined || y === undefined) reset()
    else mutate({ x, y })
  }, [x, y, mutate, reset])
  return (
    <section aria-label="What fits here" data-testid="room-panel" className="flex min-h-0 flex-1 flex-col">
      <div className="flex items-center justify-between px-4 pt-4">
        <h2 className="font-heading text-xl">What fits here?</h2>
        <button type="button" className={`${QUIET} -mr-3`} onClick={onClose}>Done</button>
      </div>
      <p className="px-4 pb-2"><strong>Tap the plan</strong>, or give two lengths:</p>
      <ByNumbers onSpot={({ x: along, y: out }) => editor.setSpot(along, out)} />
      <div className="min-h-0 flex-1 overflow-y-auto border-t border-rule" aria-busy={isPending}>
        {isPending ? <p role="status" className="p-4 text-ink-soft">Trying the library</p> : null}
        {error && spot ? <div role="alert" className="p-4"><p>{error.message}</p><button type="button" className={`${PLAIN} mt-2`} onClick={() => mutate(spot)}>Ask again</button></div> : null}
        {data && spot && !isPending ? <Answered answer={data} spot={spot} sheet={sheet} /> : null}
      </div>
    </section>
  )
}
