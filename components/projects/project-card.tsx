import Link from 'next/link'
import type { Route } from 'next'
import { FindingCounts } from '@/components/findings/finding-counts'
import { When } from '@/components/ui'
import { STAGE_WORDS, type Stage } from '@/lib/project'
import type { FindingKind } from '@/lib/spacing'

interface Project {
  id: string
  name: string
  address: string
  clientName: string
  stage: Stage
  zone: string
  facades: { id: string; name: string }[]
  counts: Record<FindingKind, number>
  placements: number
  updatedAt: number
}

/** One project in the list: who, where, how far, and what the check says of all its facades. */
export function ProjectCard({ project }: { project: Project }) {
  const { id, name, address, clientName, stage, zone, facades, counts, placements, updatedAt } = project
  return (
    <article className="grid h-full content-start gap-2 border border-rule bg-sheet p-4">
      <div className="flex items-baseline justify-between gap-3">
        <h2 className="font-heading text-2xl">
          <Link href={`/projects/${id}` as Route} className="inline-flex min-h-11 items-center underline decoration-rule underline-offset-4 hover:decoration-ink">{name}</Link>
        </h2>
        <span className="border border-ink-soft px-2 py-0.5">{STAGE_WORDS[stage]}</span>
      </div>
      <p>{[clientName, address].filter(Boolean).join(', ') || 'No client named yet'}</p>
      <FindingCounts counts={counts} isPlanted={placements > 0} />
      <p className="text-ink-soft">Zone {zone}. {facades.length === 0 ? 'No facade yet' : facades.map((facade) => facade.name).join(', ')}. Changed <When at={updatedAt} />.</p>
    </article>
  )
}
