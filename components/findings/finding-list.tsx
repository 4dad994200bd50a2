'use client'
/** Findings in plain sentences, worst first. Choosing one shows it on the drawing. */
import type { ReactNode } from 'react'
import { formatLength } from '@/lib/measure'
import { plantKeys } from '@/lib/sheet'
import { describe, RULES, type Finding, type Sheet } from '@/lib/spacing'
import { KindMark, KIND_WORDS } from './kind-mark'

interface Props {
  findings: readonly Finding[]
  sheet: Sheet
  /** Key of the finding shown on the drawing. */
  chosen: string | null
  /** Placement selected on the drawing: what is said of it stands out. */
  selected: string | null
  onChoose: (key: string | null) => void
  /** What can be done about the chosen one. */
  renderChosen?: (finding: Finding) => ReactNode
}

const MEASURES = new Map(RULES.map(({ meta }) => [meta.id, meta.measures]))

const percent = (share: number) => `${Math.round(share * 100)} %`

/** A limit or a measure in words, to the quarter inch. */
function figure({ rule }: Finding, value: number | null): string | null {
  if (value === null) return null
  switch (MEASURES.get(rule)) {
    case 'share':
      return percent(value)
    case 'count':
      return String(value)
    case undefined:
      return formatLength(Math.round(value * 4) / 4)
  }
}

function measuredText(finding: Finding): string | null {
  const { measured } = finding
  if (!measured) return null
  const [low, expected, high] = [measured.low, measured.expected, measured.high].map((value) => figure(finding, value))
  if (!expected) return null
  return low && high ? [low, expected, high].join(', ') : expected
}

function factsOf(finding: Finding): [string, string][] {
  const facts: [string, string | null][] = [
    ['Limit', figure(finding, finding.limit)],
    ['Low, expected, high', measuredText(finding)],
    ['Over by at most', finding.excess > 0 ? formatLength(Math.round(finding.excess * 4) / 4) : null],
  ]
  return facts.filter((fact): fact is [string, string] => fact[1] !== null)
}

function Facts({ finding }: { finding: Finding }) {
  const facts = factsOf(finding)
  if (facts.length === 0) return null
  return (
    <dl className="mt-2 grid grid-cols-[auto_1fr] gap-x-3 gap-y-0.5 text-sm xl:text-[15px]">
      {facts.map(([name, value]) => (
        <div key={name} className="col-span-2 grid grid-cols-subgrid">
          <dt className="text-ink-soft">{name}</dt>
          <dd className="font-mono tabular-nums">{value}</dd>
        </div>
      ))}
    </dl>
  )
}

/** The drawing's letters of the plants a finding names. */
function Keys({ letters }: { letters: readonly string[] }) {
  return letters.map((letter) => (
    <span key={letter} className="mr-1.5 inline-grid size-6 place-items-center rounded-full border border-ink align-text-bottom font-sans text-sm font-bold not-italic">{letter}</span>
  ))
}

interface OneProps extends Pick<Props, 'onChoose' | 'sheet' | 'renderChosen'> {
  finding: Finding
  letters: readonly string[]
  isChosen: boolean
  isConcerned: boolean
}

function OneFinding({ finding, letters, sheet, isChosen, isConcerned, onChoose, renderChosen }: OneProps) {
  const { title, sentence, wayOut } = describe(finding, sheet)
  return (
    <li className={`border-b border-rule ${isChosen ? 'bg-sheet' : ''}`}>
      <button
        type="button"
        aria-pressed={isChosen}
        onClick={() => onChoose(isChosen ? null : finding.key)}
        className={`flex min-h-11 w-full gap-3 border-l-4 px-4 py-3 text-left focus-visible:outline-2 focus-visible:-outline-offset-2 focus-visible:outline-leaf ${isChosen ? 'border-leaf' : isConcerned ? 'border-ink-soft' : 'border-transparent'}`}
      >
        <KindMark kind={finding.kind} />
        <span className="min-w-0">
          <span className="botanical block text-lg leading-tight"><Keys letters={letters} />{title}</span>
          <span className="block"><span className="font-bold">{KIND_WORDS[finding.kind]}.</span> {sentence}</span>
          {wayOut ? <span className="mt-1 block text-ink-soft">{wayOut}</span> : null}
        </span>
      </button>
      {isChosen ? <div className="px-4 pb-4 pl-12"><Facts finding={finding} />{renderChosen?.(finding)}</div> : null}
    </li>
  )
}

/** See `Props`. Says so when there is nothing to say. */
export function FindingList({ findings, sheet, chosen, selected, onChoose, renderChosen }: Props) {
  const keys = plantKeys(sheet)
  const plantOf = new Map(sheet.placements.map(({ id, plant }) => [id, plant]))
  const lettersOf = ({ placements }: Finding) => [...new Set(placements.flatMap((id) => keys.get(plantOf.get(id) ?? '') ?? []))]
  if (findings.length === 0) {
    return <p className="p-4">{sheet.placements.length === 0 ? 'What will outgrow its place is told here once something is planted.' : 'Nothing here will outgrow its place.'}</p>
  }
  return (
    <ul>
      {findings.map((finding) => (
        <OneFinding key={finding.key} finding={finding} letters={lettersOf(finding)} sheet={sheet} renderChosen={renderChosen} isChosen={finding.key === chosen} isConcerned={selected !== null && finding.placements.includes(selected)} onChoose={onChoose} />
      ))}
    </ul>
  )
}
