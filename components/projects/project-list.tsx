import type { Route } from 'next'
import Link from 'next/link'
import type { ReactNode } from 'react'
import { FindingCounts } from '@/components/findings/finding-counts'
import { When } from '@/components/ui'
import type { Stage } from '@/lib/project'
import type { FindingKind } from '@/lib/spacing'
import { StageBadge } from './stage-badge'

interface ProjectLine {
  id: string
  name: string
  address: string
  clientName: string
  stage: Stage
  zone: string
  facades: readonly { id: string; name: string }[]
  /** Over all facades. */
  counts: Readonly<Record<FindingKind, number>>
  placements: number
  updatedAt: number
}

/** One set of columns for the heads and every line, from a laptop's width on; below it each line is a card. */
const COLUMNS = 'lg:grid lg:grid-cols-[minmax(0,1.5fr)_7rem_4rem_minmax(0,1.3fr)_minmax(0,1.4fr)_9rem] lg:gap-x-5'

function Cell({ label, children, className = '' }: { label: string; children: ReactNode; className?: string }) {
  return (
    <div className={`flex gap-3 lg:block ${className}`}>
      <dt className="w-24 shrink-0 text-ink-soft lg:sr-only">{label}</dt>
      <dd className="min-w-0">{children}</dd>
    </div>
  )
}

function FacadeLinks({ id, facades }: Pick<ProjectLine, 'id' | 'facades'>) {
  if (facades.length === 0) return <span className="text-ink-soft">None yet</span>
  return (
    <ul className="flex flex-wrap gap-x-4">
      {facades.map((facade) => (
        <li key={facade.id}>
          <Link href={`/projects/${id}/facades/${facade.id}` as Route} className="-my-2.5 inline-flex min-h-11 items-center underline decoration-rule underline-offset-4 hover:decoration-ink">{facade.name}</Link>
        </li>
      ))}
    </ul>
  )
}

function Line({ project }: { project: ProjectLine }) {
  const { id, name, address, clientName, stage, zone, facades, counts, placements, updatedAt } = project
  return (
    <li className="border-t border-rule first:border-t-0">
      <article aria-label={name} className={`px-4 py-4 ${COLUMNS}`}>
        <div className="min-w-0 pb-3 lg:pb-0">
          <h2 className="font-heading text-xl leading-tight break-words">
            <Link href={`/projects/${id}` as Route} className="-my-2.5 inline-flex min-h-11 items-center underline decoration-rule underline-offset-4 hover:decoration-ink">{name}</Link>
          </h2>
          {address && <p className="break-words text-ink-soft">{address}</p>}
          {clientName && <p className="break-words text-ink-soft">for {clientName}</p>}
        </div>
        <dl className="grid gap-2 lg:contents">
          <Cell label="Stage"><StageBadge stage={stage} /></Cell>
          <Cell label="Zone"><span className="font-mono">{zone}</span></Cell>
          <Cell label="Facades"><FacadeLinks id={id} facades={facades} /></Cell>
          <Cell label="Findings"><FindingCounts counts={counts} none={placements === 0 ? 'Nothing planted yet' : 'Nothing outgrows its place'} /></Cell>
          <Cell label="Changed" className="text-ink-soft"><When at={updatedAt} /></Cell>
        </dl>
      </article>
    </li>
  )
}

const HEADS = ['Project', 'Stage', 'Zone', 'Facades', 'Findings', 'Changed']

/** The studio's projects, one line each. */
export function ProjectList({ projects }: { projects: readonly ProjectLine[] }) {
  return (
    <div className="border border-rule bg-sheet">
      <div aria-hidden="true" className={`hidden border-b border-ink px-4 py-2 text-sm font-bold ${COLUMNS}`}>
        {HEADS.map((head) => <span key={head}>{head}</span>)}
      </div>
      <ul>{projects.map((project) => <Line key={project.id} project={project} />)}</ul>
    </div>
  )
}
