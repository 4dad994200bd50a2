import { FINDING_KINDS, type FindingKind } from '@/lib/spacing'
import { KindMark, KIND_WORDS } from './kind-mark'

interface Props {
  counts: Readonly<Record<FindingKind, number>>
  /** What is said when there is nothing to count. */
  none?: string
}

const wordOf = (kind: FindingKind, count: number) => {
  const word = KIND_WORDS[kind].toLowerCase()
  return kind === 'held' || count === 1 ? word : `${word}s`
}

/** How many findings of each kind, worst first: mark, number, word. Kinds without any are left out. */
export function FindingCounts({ counts, none = 'Nothing outgrows its place' }: Props) {
  const kinds = FINDING_KINDS.filter((kind) => counts[kind] > 0)
  if (kinds.length === 0) return <p className="text-ink-soft">{none}</p>
  return (
    <ul className="flex flex-wrap gap-x-4 gap-y-1">
      {kinds.map((kind) => (
        <li key={kind} className="flex items-start gap-1.5 whitespace-nowrap">
          <KindMark kind={kind} />
          <span><span className="font-mono font-bold">{counts[kind]}</span> {wordOf(kind, counts[kind])}</span>
        </li>
      ))}
    </ul>
  )
}
