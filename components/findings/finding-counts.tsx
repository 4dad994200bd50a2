import { FINDING_KINDS, type FindingKind } from '@/lib/spacing'
import { KIND_WORDS, KindMark } from './kind-mark'

const PLURALS: Record<FindingKind, string> = { conflict: 'conflicts', risk: 'risks', held: 'held', note: 'notes' }

/** How many findings of each kind: mark, number and word. Says so when there are none. */
export function FindingCounts({ counts, isPlanted }: { counts: Record<FindingKind, number>; isPlanted: boolean }) {
  const kinds = FINDING_KINDS.filter((kind) => counts[kind] > 0)
  if (kinds.length === 0) return <p className="text-ink-soft">{isPlanted ? 'Nothing outgrows its place' : 'Nothing planted yet'}</p>
  return (
    <ul className="flex flex-wrap gap-x-4 gap-y-1">
      {kinds.map((kind) => (
        <li key={kind} className="flex items-center gap-1.5">
          <KindMark kind={kind} />
          <span><span className="font-mono tabular-nums">{counts[kind]}</span> {counts[kind] === 1 ? KIND_WORDS[kind].toLowerCase() : PLURALS[kind]}</span>
        </li>
      ))}
    </ul>
  )
}
