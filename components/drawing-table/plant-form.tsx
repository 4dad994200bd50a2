'use client'
/** The selected plant: where it stands, how large it is planted, how large it is kept, what part it plays. */
import { useId, useState } from 'react'
import { LengthField } from '@/components/site/length-field'
import { TypedField } from '@/components/site/typed-field'
import { echoLength, formatLength, parseLength } from '@/lib/measure'
import { plantKeys } from '@/lib/sheet'
import { matureSize, ROLES_IN_BED, STATUSES, wallDistance, type Placement, type PlacementRole, type PlacementStatus, type Sheet, type Size } from '@/lib/spacing'
import { outFromWall } from './editor'
import { useDesk, useEditorState } from './desk-context'
import { CommandButton, PLAIN } from './parts'

const ROLE_WORDS: Record<PlacementRole, string> = { shrub: 'Shrub', specimen: 'Specimen', anchor: 'Anchor', filler: 'Filler', hedge: 'Hedge', 'on-wall': 'Trained on the wall' }
const STATUS_WORDS: Record<PlacementStatus, string> = { new: 'To be planted', stays: 'Stands here and stays', goes: 'Stands here and goes' }

interface CommittedProps<T> {
  label: string
  value: T
  readOnly: boolean
  /** Takes the value; answers what is wrong with it. */
  onCommit: (value: T) => string | null
}

/** What is typed and not yet kept. */
function useDraft<T>({ value, onCommit }: Pick<CommittedProps<T>, 'value' | 'onCommit'>) {
  const [draft, setDraft] = useState<{ value: T } | null>(null)
  const [problem, setProblem] = useState<string | null>(null)
  return {
    value: draft ? draft.value : value,
    problem,
    onValue: (next: T) => {
      setDraft(next === value ? null : { value: next })
      setProblem(null)
    },
    onLeave: () => {
      if (!draft) return
      const wrong = onCommit(draft.value)
      setProblem(wrong)
      if (wrong === null) setDraft(null)
    },
  }
}

function Committed({ label, readOnly, ...rest }: CommittedProps<number>) {
  return <LengthField label={label} units="imperial" readOnly={readOnly} {...useDraft(rest)} />
}

/** A kept size: empty means the plant is never clipped. */
function KeptField({ label, readOnly, ...rest }: CommittedProps<number | undefined>) {
  return (
    <TypedField<number | undefined>
      label={label}
      readOnly={readOnly}
      read={(text) => {
        if (text.trim() === '') return { ok: true, value: undefined }
        const read = parseLength(text)
        return read.ok ? { ok: true, value: read.inches } : read
      }}
      write={(inches) => (inches === undefined ? '' : formatLength(inches))}
      echo={(inches) => (inches === undefined ? 'never clipped' : echoLength(inches))}
      {...useDraft(rest)}
    />
  )
}

interface ChoiceProps<T extends string> {
  label: string
  value: T
  choices: readonly T[]
  words: Record<T, string>
  readOnly: boolean
  onChoice: (value: T) => void
}

function Choice<T extends string>({ label, value, choices, words, readOnly, onChoice }: ChoiceProps<T>) {
  const id = useId()
  return (
    <div>
      <label htmlFor={id} className="block text-sm text-ink-soft">{label}</label>
      <select
        id={id}
        value={value}
        disabled={readOnly}
        onChange={(event) => {
          const next = choices.find((choice) => choice === event.target.value)
          if (next) onChoice(next)
        }}
        className="min-h-11 w-full rounded-sm border border-ink-soft bg-sheet px-2 focus-visible:outline-2 focus-visible:outline-offset-1 focus-visible:outline-leaf disabled:bg-paper disabled:text-ink disabled:opacity-100"
      >
        {choices.map((choice) => <option key={choice} value={choice}>{words[choice]}</option>)}
      </select>
    </div>
  )
}

function DriftField({ value, readOnly, onCommit }: { value: string; readOnly: boolean; onCommit: (value: string) => string | null }) {
  const id = useId()
  const [typed, setTyped] = useState<string | null>(null)
  const commit = () => {
    if (typed === null || typed.trim() === value || onCommit(typed.trim()) === null) setTyped(null)
  }
  return (
    <div>
      <label htmlFor={id} className="block text-sm text-ink-soft">Drift</label>
      <input
        id={id}
        value={typed ?? value}
        readOnly={readOnly}
        maxLength={64}
        placeholder={readOnly ? '' : 'on its own'}
        onChange={(event) => setTyped(event.target.value)}
        onBlur={commit}
        onKeyDown={(event) => event.key === 'Enter' && commit()}
        className="min-h-11 w-full rounded-sm border border-ink-soft bg-sheet px-2.5 read-only:bg-paper focus-visible:outline-2 focus-visible:outline-offset-1 focus-visible:outline-leaf"
      />
    </div>
  )
}

/** Kept sizes with one of them changed; none when neither is left. */
function withKept(placement: Placement, change: { height?: number | undefined; spread?: number | undefined }): Placement {
  const merged = { ...placement.kept, ...change }
  const kept: Partial<Size> = {
    ...(merged.height !== undefined && { height: merged.height }),
    ...(merged.spread !== undefined && { spread: merged.spread }),
  }
  const next: Placement = { ...placement, kept }
  if (Object.keys(kept).length === 0) delete next.kept
  return next
}

function withDrift(placement: Placement, drift: string): Placement {
  const next: Placement = { ...placement, drift }
  if (drift === '') delete next.drift
  return next
}

function Head({ sheet, placement }: { sheet: Sheet; placement: Placement }) {
  const plant = sheet.plants.find(({ id }) => id === placement.plant)
  const key = plantKeys(sheet).get(placement.plant)
  if (!plant) return <p>This plant is not known here.</p>
  const [low, high] = [matureSize(plant, placement, 'low'), matureSize(plant, placement, 'high')]
  const range = (a: number, b: number) => (Math.round(a) === Math.round(b) ? formatLength(Math.round(a)) : `${formatLength(Math.round(a))} to ${formatLength(Math.round(b))}`)
  return (
    <header>
      <h2 className="font-heading text-xl leading-tight"><em>{plant.botanical}</em>{key ? ` · ${key}` : ''}</h2>
      <p className="text-ink-soft">{plant.common}</p>
      <p className="mt-1">Full-grown {range(low.height, high.height)} tall, {range(low.spread, high.spread)} across.</p>
    </header>
  )
}

/** The form of the selected plant; says how to get one when none is. */
export function PlantForm() {
  const { editor } = useDesk()
  const { sheet, selected } = useEditorState()
  const placement = editor.placement(selected)
  if (!placement) return <p className="p-4">Select a plant on the drawing or in the table, and its numbers stand here.</p>
  const common = sheet.plants.find(({ id }) => id === placement.plant)?.common ?? 'Plant'
  const readOnly = !editor.canEdit
  const put = (next: Placement, what: string) => editor.put(next, `${common}: ${what}`)
  const { planted, kept, role = 'shrub', status = 'new' } = placement
  return (
    // A new plant gets new fields: nothing typed for one may reach another.
    <div key={placement.id} className="space-y-4 p-4">
      <Head sheet={sheet} placement={placement} />
      <div className="grid grid-cols-2 gap-3">
        <Committed label="Along the wall" readOnly={readOnly} value={placement.x} onCommit={(x) => put({ ...placement, x }, 'moved along the wall')} />
        <Committed label="From the wall" readOnly={readOnly} value={wallDistance(sheet.facade, placement.x, placement.y)} onCommit={(out) => put({ ...placement, y: outFromWall(sheet.facade, placement.x, out) }, 'moved from the wall')} />
        <Committed label={status === 'new' ? 'Planted height' : 'Height today'} readOnly={readOnly} value={planted.height} onCommit={(height) => put({ ...placement, planted: { ...planted, height } }, 'planted height')} />
        <Committed label={status === 'new' ? 'Planted spread' : 'Spread today'} readOnly={readOnly} value={planted.spread} onCommit={(spread) => put({ ...placement, planted: { ...planted, spread } }, 'planted spread')} />
        <KeptField label="Kept height" readOnly={readOnly} value={kept?.height} onCommit={(height) => put(withKept(placement, { height }), 'kept height')} />
        <KeptField label="Kept spread" readOnly={readOnly} value={kept?.spread} onCommit={(spread) => put(withKept(placement, { spread }), 'kept spread')} />
        <Choice label="Part it plays" value={role} choices={ROLES_IN_BED} words={ROLE_WORDS} readOnly={readOnly} onChoice={(next) => put({ ...placement, role: next }, 'part it plays')} />
        <DriftField value={placement.drift ?? ''} readOnly={readOnly} onCommit={(drift) => put(withDrift(placement, drift), 'drift')} />
      </div>
      <Choice label="On site" value={status} choices={STATUSES} words={STATUS_WORDS} readOnly={readOnly} onChoice={(next) => put({ ...placement, status: next }, 'on site')} />
      {readOnly ? null : (
        <div className="flex flex-wrap gap-2">
          <CommandButton id="pick-up" label="Pick up, then tap where it goes">Pick up</CommandButton>
          <button type="button" className={PLAIN} onClick={() => editor.remove(placement.id)}>Remove</button>
        </div>
      )}
    </div>
  )
}
