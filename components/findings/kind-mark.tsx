/** A finding's kind by form as well as colour: filled diamond, half diamond, notched square, open ring. */
import type { FindingKind } from '@/lib/spacing'

export const KIND_WORDS: Record<FindingKind, string> = { conflict: 'Conflict', risk: 'Risk', held: 'Held', note: 'Note' }

const FORMS: Record<FindingKind, React.ReactNode> = {
  conflict: <path d="M10 2l8 8-8 8-8-8z" className="fill-conflict" />,
  risk: (
    <>
      <path d="M10 2l8 8-8 8-8-8z" className="fill-sheet stroke-ink" strokeWidth="1.4" />
      <path d="M10 2v16l-8-8z" className="fill-risk stroke-ink" strokeWidth="1.4" />
    </>
  ),
  held: <path d="M3 3h14v14h-5v-5H8v5H3z" className="fill-held" />,
  note: <circle cx="10" cy="10" r="6.5" className="fill-none stroke-note" strokeWidth="2.2" />,
}

/** Decorative: the word stands beside it. */
export function KindMark({ kind }: { kind: FindingKind }) {
  return <svg viewBox="0 0 20 20" aria-hidden="true" className="mt-0.5 size-5 shrink-0">{FORMS[kind]}</svg>
}
