import { STAGE_WORDS, type Stage } from '@/lib/project'

/** Where a project stands, as a small stamp. */
export function StageBadge({ stage }: { stage: Stage }) {
  return <span className="inline-block rounded-sm border border-ink-soft bg-sheet px-2 py-0.5 text-sm whitespace-nowrap">{STAGE_WORDS[stage]}</span>
}
