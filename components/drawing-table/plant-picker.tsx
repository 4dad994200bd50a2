'use client'
/** Choosing a plant from the library and setting it: by a tap in the plan, or by two lengths. */
import { useEffect, useId, useRef, useState } from 'react'
import { LengthField } from '@/components/site/length-field'
import { rangeText, type Plant } from '@/lib/plants'
import { outFromWall } from './editor'
import { useDesk, useEditorState } from './desk-context'
import { PLAIN, QUIET, STRONG } from './parts'
import { sheetPlant, usePlantSearch } from './plant-search'

function PlantRow({ plant, isChosen, onChoose }: { plant: Plant; isChosen: boolean; onChoose: () => void }) {
  return (
    <li className="border-b border-rule">
      <button
        type="button"
        aria-pressed={isChosen}
        onClick={onChoose}
        className="min-h-11 w-full px-4 py-2 text-left hover:bg-sheet focus-visible:outline-2 focus-visible:-outline-offset-2 focus-visible:outline-leaf aria-pressed:bg-sheet aria-pressed:shadow-[inset_3px_0_0_var(--color-leaf)]"
      >
        <span className="block font-heading text-lg leading-tight italic">{plant.botanical}</span>
        <span className="block">{plant.common}</span>
        <span className="block font-mono text-sm text-ink-soft">{rangeText(plant.heightMin, plant.heightMax)} tall, {rangeText(plant.spreadMin, plant.spreadMax)} across</span>
      </button>
    </li>
  )
}

/** Sets the chosen plant by numbers. */
function ByNumbers({ plant }: { plant: Plant }) {
  const { editor } = useDesk()
  const { sheet } = useEditorState()
  const { wall } = sheet.facade
  const [x, setX] = useState(() => Math.round(((wall[0]?.x ?? 0) + (wall.at(-1)?.x ?? 0)) / 2))
  const [out, setOut] = useState(36)
  return (
    <div className="border-t border-rule p-4">
      <p><strong>Tap the plan</strong> where <em className="font-heading">{plant.botanical}</em> goes, or give two lengths:</p>
      <div className="mt-2 grid grid-cols-2 gap-3">
        <LengthField label="Along the wall" units="imperial" value={x} onValue={setX} />
        <LengthField label="From the wall" units="imperial" value={out} onValue={setOut} />
      </div>
      <button type="button" className={`${STRONG} mt-2`} onClick={() => editor.add(plant, x, outFromWall(sheet.facade, x, out))}>Plant it here</button>
    </div>
  )
}

/** The library beside the drawing. */
export function PlantPicker({ onClose }: { onClose: () => void }) {
  const { editor } = useDesk()
  const { tool } = useEditorState()
  const [text, setText] = useState('')
  const id = useId()
  const field = useRef<HTMLInputElement>(null)
  const found = usePlantSearch(text)
  const chosen = tool.kind === 'plant' ? tool.plant : null
  useEffect(() => field.current?.focus(), [])
  return (
    <section aria-label="Choose a plant" data-testid="plant-picker" className="flex min-h-0 flex-1 flex-col">
      <div className="p-4 pb-2">
        <div className="flex items-center justify-between">
          <h2 className="font-heading text-xl">Choose a plant</h2>
          <button type="button" className={`${QUIET} -mr-3`} onClick={onClose}>Done</button>
        </div>
        <label htmlFor={id} className="block text-sm text-ink-soft">Botanical or common name</label>
        <input
          ref={field}
          id={id}
          type="search"
          autoComplete="off"
          spellCheck={false}
          value={text}
          onChange={(event) => setText(event.target.value)}
          onKeyDown={(event) => event.key === 'Escape' && onClose()}
          placeholder="ilex gla"
          className="min-h-11 w-full rounded-sm border border-ink-soft bg-sheet px-2.5 focus-visible:outline-2 focus-visible:outline-offset-1 focus-visible:outline-leaf"
        />
      </div>
      <div className="min-h-0 flex-1 overflow-y-auto" aria-busy={found.isFetching}>
        {found.isError ? (
          <div className="p-4" role="alert">
            <p>{found.error.message}</p>
            <button type="button" className={`${PLAIN} mt-2`} onClick={() => void found.refetch()}>Ask again</button>
          </div>
        ) : null}
        {found.isPending ? <p className="p-4 text-ink-soft">Looking in the library</p> : null}
        {found.data?.length === 0 ? <p className="p-4">No plant of that name in the library. Fewer letters find more.</p> : null}
        <ul>
          {found.data?.map((plant) => (
            <PlantRow key={plant.id} plant={plant} isChosen={chosen?.id === plant.id} onChoose={() => editor.setTool({ kind: 'plant', plant: sheetPlant(plant) })} />
          ))}
        </ul>
      </div>
      {chosen ? <ByNumbers key={chosen.id} plant={chosen} /> : null}
    </section>
  )
}
