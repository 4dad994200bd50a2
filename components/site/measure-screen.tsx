'use client'
/** The measure screen of one facade: the numbers on the left, the drawing that follows them on the right. */
import { useRouter } from 'next/navigation'
import { useCallback, useEffect, useRef, useState, useSyncExternalStore, type KeyboardEvent } from 'react'
import { v7 as newId } from 'uuid'
import type { Sheet } from '@/lib/spacing'
import { AreasSection } from './areas-section'
import { AspectSection } from './aspect-section'
import { ClashPanel } from './clash-panel'
import { FixturesSection } from './fixtures-section'
import { HouseSection } from './house-section'
import type { Units } from './length-field'
import { MeasureProvider, useMeasure } from './measure-context'
import { MeasureDrawing } from './measure-drawing'
import { Measuring } from './measuring'
import { OpeningsSection } from './openings-section'
import { ActionButton, Choice } from './parts'
import { SaveStatus } from './save-status'
import { Saver } from './saver'
import { sheetCalls } from './sheet-calls'
import { SoilSection } from './soil-section'
import { useLeaveGuard } from './use-leave-guard'

interface Props {
  facade: { id: string; name: string }
  sheet: Sheet
  seq: number
  readOnly: boolean
}

const PARTS = [
  ['house', 'House front'], ['soil', 'Soil'], ['light', 'Facing and light'], ['openings', 'Windows and doors'],
  ['fixtures', 'Fixtures'], ['walks', 'Walks'], ['beds', 'Beds'],
] as const
const UNIT_WORDS = { imperial: 'Feet and inches', metric: 'Centimeters' } as const

/** Made once for the life of the page: the store of the form and the line to the server. */
function useMeasuring({ facade, sheet, seq }: Props) {
  return useState(() => {
    const saver = new Saver({ seq, editor: newId(), calls: sheetCalls(facade.id), now: () => Date.now() })
    return { saver, measuring: new Measuring(sheet, { send: saver.send, newId }) }
  })[0]
}

export function MeasureScreen(props: Props) {
  const { saver, measuring } = useMeasuring(props)
  return (
    <MeasureProvider measuring={measuring} readOnly={props.readOnly}>
      <Desk saver={saver} facadeName={props.facade.name} />
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

function Desk({ saver, facadeName }: { saver: Saver; facadeName: string }) {
  const { measuring, state, readOnly } = useMeasure()
  const saving = useSyncExternalStore(saver.subscribe, saver.getState, saver.getState)
  const router = useRouter()
  const desk = useRef<HTMLDivElement>(null)
  const [leavingTo, setLeavingTo] = useState<string | null>(null)
  const hasUnsaved = useCallback(
    () => saver.hasWaiting() || measuring.getState().drafts.size > 0 || desk.current?.querySelector('[aria-invalid]') !== null,
    [saver, measuring],
  )
  useLeaveGuard(hasUnsaved, setLeavingTo)
  useEffect(() => {
    window.addEventListener('online', saver.retry)
    return () => window.removeEventListener('online', saver.retry)
  }, [saver])

  return (
    <div ref={desk} onKeyDown={(event) => (readOnly ? undefined : stepKeys(event, measuring))}>
      <Bar saver={saver} />
      {leavingTo === null ? null : <LeaveQuestion onStay={() => setLeavingTo(null)} onLeave={() => router.push(leavingTo)} />}
      {saving.kind === 'clash' ? (
        <ClashPanel
          state={saving}
          onTheirs={() => adopt(measuring, saver.takeTheirs(), 'Theirs taken')}
          onMine={() => adopt(measuring, saver.keepMine(), 'Mine kept')}
        />
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
        <div className="sticky top-16 order-first max-h-[calc(100dvh-5rem)] overflow-hidden border border-rule bg-sheet lg:order-none [&_svg]:h-auto [&_svg]:max-h-[calc(100dvh-6rem)] [&_svg]:w-full">
          <MeasureDrawing label={`${facadeName}, as measured so far: elevation above, plan below`} />
          {state.drafts.size > 0 && state.shown === state.sheet ? <p className="px-3 pb-2 text-sm text-ink-soft">The drawing shows the last measures that hold together.</p> : null}
        </div>
      </div>
    </div>
  )
}

function adopt(measuring: Measuring, sheet: Sheet | null, said: string) {
  if (sheet) measuring.adopt(sheet, said)
}

function Bar({ saver }: { saver: Saver }) {
  const { measuring, state, readOnly, units, setUnits } = useMeasure()
  const saving = useSyncExternalStore(saver.subscribe, saver.getState, saver.getState)
  const waiting = [...state.drafts.values()].filter(({ problems }) => problems.length > 0).length
  const before = state.past.at(-1)
  const after = state.future.at(-1)
  return (
    <div className="sticky top-0 z-10 -mx-1 flex flex-wrap items-center gap-x-4 gap-y-1 border-b border-rule bg-paper px-1 py-1">
      <nav aria-label="Parts of the measure" className="flex flex-wrap">
        {PARTS.map(([id, title]) => (
          <a key={id} href={`#${id}`} className="flex min-h-11 items-center px-2 underline decoration-rule underline-offset-4 hover:decoration-ink">{title}</a>
        ))}
      </nav>
      <Choice<Units> label="Show" value={units} choices={['imperial', 'metric']} words={UNIT_WORDS} onChoice={setUnits} />
      {readOnly ? (
        <p>You can read these measures. Owners and designers change them.</p>
      ) : (
        <>
          <span className="flex gap-1">
            <ActionButton kind="plain" label={before ? `Undo: ${before.label}` : 'Undo: nothing yet'} isDisabled={!before} onPress={measuring.undo}>Undo</ActionButton>
            <ActionButton kind="plain" label={after ? `Redo: ${after.label}` : 'Redo: nothing yet'} isDisabled={!after} onPress={measuring.redo}>Redo</ActionButton>
          </span>
          <SaveStatus state={saving} waitingFields={waiting} onRetry={saver.retry} />
          <p role="status" className="text-sm text-ink-soft">{state.said}</p>
        </>
      )}
    </div>
  )
}

function LeaveQuestion({ onStay, onLeave }: { onStay: () => void; onLeave: () => void }) {
  return (
    <div role="alertdialog" aria-labelledby="leave-title" className="my-2 border-2 border-risk bg-sheet p-4">
      <p id="leave-title" className="font-bold">Something typed here is not saved. Leave the page and lose it?</p>
      <div className="mt-2 flex gap-2">
        <ActionButton kind="strong" onPress={onStay}>Stay here</ActionButton>
        <ActionButton kind="plain" onPress={onLeave}>Leave</ActionButton>
      </div>
    </div>
  )
}
