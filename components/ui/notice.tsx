import type { ReactNode } from 'react'

export type NoticeTone = 'info' | 'good' | 'warning' | 'error'

/** Colour is never alone: each tone has its own mark and its own word for those who hear the page. */
const TONES: Record<NoticeTone, { edge: string; ink: string; mark: string; word: string }> = {
  info: { edge: 'border-held', ink: 'text-held', mark: 'M3 3h10v7l-3 3H3z', word: 'To know' },
  good: { edge: 'border-leaf', ink: 'text-leaf', mark: 'M2.5 8.5l4 4 7-9', word: 'Done' },
  warning: { edge: 'border-risk', ink: 'text-ink', mark: 'M8 1.5L14.5 8 8 14.5 1.5 8z', word: 'Take care' },
  error: { edge: 'border-conflict', ink: 'text-conflict', mark: 'M3 3l10 10M13 3L3 13', word: 'Not done' },
}

interface NoticeProps {
  tone: NoticeTone
  title?: string
  children?: ReactNode
}

/** A message that stays on the page. An error speaks up at once, the others when there is a pause. */
export function Notice({ tone, title, children }: NoticeProps) {
  const { edge, ink, mark, word } = TONES[tone]
  return (
    <div role={tone === 'error' ? 'alert' : 'status'} className={`flex gap-3 rounded-sm border border-l-4 bg-sheet px-4 py-3 ${edge}`}>
      <svg viewBox="0 0 16 16" aria-hidden="true" className={`mt-1 size-4 shrink-0 fill-none stroke-current ${ink}`} strokeWidth={2}>
        <path d={mark} />
      </svg>
      <div className="min-w-0">
        <span className="sr-only">{word}: </span>
        {title && <p className="font-bold">{title}</p>}
        {children && <div>{children}</div>}
      </div>
    </div>
  )
}
