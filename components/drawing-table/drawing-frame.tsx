'use client'
/** The drawing's place on the page: its focus, its keys, its words for those who cannot see it. */
import dynamic from 'next/dynamic'
import { useRef } from 'react'
import { useDesk, useEditorState } from './desk-context'
import { PLAIN, STRONG } from './parts'
import { useKeys } from './use-keys'

const DrawingCanvas = dynamic(() => import('./canvas/drawing-canvas'), { ssr: false, loading: () => <p className="p-6 text-ink-soft">Laying out the sheet</p> })

function Hint() {
  const { editor } = useDesk()
  const { isCarried, tool } = useEditorState()
  if (isCarried) {
    return (
      <div className="absolute inset-x-0 top-3 mx-auto flex w-fit items-center gap-3 border border-leaf bg-sheet py-1 pr-1 pl-4 shadow-md">
        <p>Picked up. Tap where it goes: in the plan both ways, in the elevation along the wall.</p>
        <button type="button" className={PLAIN} onClick={editor.cancelMove}>Put back</button>
      </div>
    )
  }
  if (tool.kind !== 'plant' || !tool.plant) return null
  return (
    <div className="absolute inset-x-0 top-3 mx-auto flex w-fit items-center gap-3 border border-leaf bg-sheet py-1 pr-1 pl-4 shadow-md">
      <p>Tap the plan where <em className="font-heading">{tool.plant.botanical}</em> goes.</p>
      <button type="button" className={PLAIN} onClick={() => editor.setTool({ kind: 'move' })}>Enough</button>
    </div>
  )
}

function EmptySheet() {
  const { editor, page } = useDesk()
  const { sheet, tool } = useEditorState()
  if (sheet.placements.length > 0 || tool.kind === 'plant') return null
  return (
    <div className="pointer-events-none absolute inset-x-0 bottom-6 flex justify-center">
      <div className="pointer-events-auto flex items-center gap-4 border border-rule bg-sheet px-5 py-3 shadow-md">
        <p className="font-heading text-lg">Nothing planted yet</p>
        {editor.canEdit ? <button type="button" className={STRONG} onClick={page.openPlants}>Choose the first plant</button> : null}
      </div>
    </div>
  )
}

export function DrawingFrame({ name }: { name: string }) {
  const desk = useDesk()
  const { sheet, selected } = useEditorState()
  const frame = useRef<HTMLDivElement>(null)
  useKeys(frame)
  return (
    <div className="relative min-h-0 min-w-0 flex-1 bg-sheet">
      <div
        ref={frame}
        role="application"
        aria-roledescription="drawing"
        aria-label={`${name}: elevation above, plan below`}
        aria-describedby="drawing-in-words"
        tabIndex={0}
        data-testid="drawing-table"
        data-placements={sheet.placements.length}
        data-selected={selected ?? ''}
        className="absolute inset-0 focus-visible:outline-3 focus-visible:-outline-offset-3 focus-visible:outline-leaf"
      >
        <DrawingCanvas desk={desk} />
      </div>
      <p id="drawing-in-words" className="sr-only">
        {sheet.placements.length} plants. The Plants table beside the drawing holds each of them with the same numbers, and every one can be added, moved and removed there. Tab goes from plant to plant, arrows move the plant selected, a question mark lists the keys.
      </p>
      <Hint />
      <EmptySheet />
    </div>
  )
}
