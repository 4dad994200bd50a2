'use client'
/** The measure screen of one facade: the numbers on the left, the drawing that follows them on the right. */
import type { Route } from 'next'
import { useRouter } from 'next/navigation'
import { useCallback, useRef, useState, useSyncExternalStore, type KeyboardEvent } from 'react'
import type { SaveQueue } from '../drawing-table/editor/save-queue'
import { AreasSection } from './areas-section'
import { AspectSection } from './aspect-section'
import { ClashPanel } from './clash-panel'
import { FixturesSection } from './fixtures-section'
import { HouseSection } from './house-section'
import type { Units } from './length-field'
import { MeasureProvider, useMeasure } from './measure-context'
import { MeasureDrawing } from './measure-drawing'
import type { Measuring } from './measuring'
import { OpeningsSection } from './openings-section'
import { ActionButton, Choice } from './parts'
import { SaveStatus } from './save-status'
import { SoilSection } from './soil-section'
import { useLeaveGuard } from './use-leave-guard'
import { useSavedSheet, type Opened } from './use-saved-sheet'

const PARTS = [
  ['house', 'House front'], ['soil', 'Soil'], ['light', 'Facing and light'], ['openings', 'Windows and doors'],
  ['fixtures', 'Fixtures'], ['walks', 'Walks'], ['beds', 'Beds'],
] as const
const UNIT_WORDS = { imperial: 'feet and inches', metric: 'cm' } as const

export function MeasureScreen(opened: Opened) {
  const { measuring, queue } = useSavedSheet(opened)
  return (
    <MeasureProvider measuring={measuring} readOnly={opened.readOnly}>
      <Desk queue={queue} facadeName={opened.facade.name} />
    </MeasureProvider>
  )
}

/** Steps back and forward by the keys people know; inside a field that is being typed in they stay the field's own. */
function stepKeys(event: KeyboardEvent, { undo, redo }: Measuring) {
  const isTyping = event.target instanceof HTMLInputElement && event.target.dataset.typing !== undefined
  const key = event.key.toLowerCase()
  if (isTyping || event.altKey || !(event.ctrlKey || event.metaKey) || (key !== 'z' && key !== 'y')) return
  event.preventDefault()
  if (key === 'y' || event.shiftKey) redo()
  else undo()
}

function Desk({ queue, facadeName }: { queue: SaveQueue; facadeName: string }) {
  const { measuring, state, readOnly } = useMeasure()
  const saving = useSyncExternalStore(queue.subscribe, queue.getSnapshot, queue.getSnapshot)
  const router = useRouter()
  const desk = useRef<HTMLDivElement>(null)
  const [leavingTo, setLeavingTo] = useState<string | null>(null)
  const hasUnsaved = useCallback(
    () => queue.unsaved.length > 0 || measuring.getState().drafts.size > 0 || desk.current?.querySelector('[aria-invalid]') !== null,
    [queue, measuring],
  )
  useLeaveGuard(hasUnsaved, setLeavingTo)
  return (
    <div ref={desk} onKeyDown={(event) => (readOnly ? undefined : stepKeys(event, measuring))}>
      <Bar queue={queue} />
      {leavingTo === null ? null : <LeaveQuestion onStay={() => setLeavingTo(null)} onLeave={() => router.push(leavingTo as Route)} />}
      {saving.phase.kind === 'conflict' ? (
        <ClashPanel clashes={saving.phase.clashes} onTheirs={() => queue.settle('theirs')} onMine={() => queue.settle('mine')} />
      ) : null}
      <div className="mt-4 grid items-start gap-4 lg:grid-cols-[minmax(0,11fr)_minmax(0,10fr)]">
        <div className="min-w-0 space-y-4">
          <HouseSection />
          <SoilSection />
          <AspectSection />
          <OpeningsSection />
          <FixturesSection />
          <AreasSection kind="walk" />
          <AreasSection kind="bed" />
        </div>
        <div className="sticky top-27 order-first max-h-[calc(100dvh-7.5rem)] overflow-hidden border border-rule bg-sheet lg:order-none [&_svg]:block [&_svg]:h-auto [&_svg]:max-h-[calc(100dvh-8rem)] [&_svg]:w-full">
          <MeasureDrawing label={`${facadeName}, as measured so far: elevation above, plan below`} />
          {state.drafts.size > 0 && state.shown === state.sheet ? <p className="px-3 pb-2 text-sm text-ink-soft">The drawing shows the last measures that hold together.</p> : null}
        </div>
      </div>
    </div>
  )
}

function Bar({ queue }: { queue: SaveQueue }) {
  const { state, readOnly, units, setUnits } = useMeasure()
  const saving = useSyncExternalStore(queue.subscribe, queue.getSnapshot, queue.getSnapshot)
  const waiting = [...state.drafts.values()].filter(({ problems }) => problems.length > 0).length
  return (
    <div className="sticky top-0 z-10 -mx-1 border-b border-rule bg-paper px-1 py-1">
      <div className="flex flex-wrap items-center justify-between gap-x-4">
        <nav aria-label="Parts of the measure" className="-ml-2 flex flex-wrap">
          {PARTS.map(([id, title]) => (
            <a key={id} href={`#${id}`} className="flex min-h-11 items-center px-2 underline decoration-rule underline-offset-4 hover:decoration-ink">{title}</a>
          ))}
        </nav>
        <Choice<Units> label="Lengths in" value={units} choices={['imperial', 'metric']} words={UNIT_WORDS} onChoice={setUnits} />
      </div>
      <div className="flex flex-wrap items-center gap-x-4 gap-y-1">
        {readOnly ? <p>You can read these measures. Owners and designers change them.</p> : <Steps />}
        {readOnly ? null : <SaveStatus state={saving} waitingThings={waiting} onRetry={queue.wake} onDismiss={queue.dismissRefusals} />}
      </div>
    </div>
  )
}

/** Undo and redo of what was measured, each saying what it would do, and the last deed in words. */
function Steps() {
  const { measuring, state } = useMeasure()
  const before = state.past.at(-1)
  const after = state.future.at(-1)
  return (
    <>
      <span className="flex gap-1">
        <ActionButton kind="plain" label={before ? `Undo: ${before.label}` : 'Undo: nothing yet'} isDisabled={!before} onPress={measuring.undo}>Undo</ActionButton>
        <ActionButton kind="plain" label={after ? `Redo: ${after.label}` : 'Redo: nothing yet'} isDisabled={!after} onPress={measuring.redo}>Redo</ActionButton>
      </span>
      <p role="status" className="text-sm text-ink-soft">{state.said}</p>
    </>
  )
}

function LeaveQuestion({ onStay, onLeave }: { onStay: () => void; onLeave: () => void }) {
  return (
    <div role="alertdialog" aria-labelledby="leave-title" className="my-2 border-2 border-risk bg-sheet p-4">
      <p id="leave-title" className="font-bold">Something typed here is not saved. Leave the page and lose it?</p>
      <div className="mt-2 flex gap-2">
        <ActionButton kind="strong" takesFocus onPress={onStay}>Stay here</ActionButton>
        <ActionButton kind="plain" onPress={onLeave}>Leave</ActionButton>
      </div>
    </div>
  )
}
