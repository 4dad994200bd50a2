import type { ReactNode } from 'react'
import { FindingCounts } from '@/components/findings/finding-counts'
import { StageBadge } from '@/components/projects/stage-badge'
import { LinkButton, When } from '@/components/ui'
import type { Stage } from '@/lib/project'
import type { FindingKind } from '@/lib/spacing'

interface Item {
  facadeId: string
  facadeName: string
  projectId: string
  projectName: string
  stage: Stage
  counts: Readonly<Record<FindingKind, number>>
  placements: number
  updatedAt: number
  /** Who drew last; null when nothing was drawn. */
  updatedBy: string | null
}

/** One set of columns for the heads and every line, from a laptop's width on; below it each line is a card. */
const COLUMNS = 'lg:grid lg:grid-cols-[minmax(0,1.3fr)_7rem_minmax(0,1.5fr)_4rem_minmax(0,1.1fr)_9rem] lg:items-center lg:gap-x-5'

function Cell({ label, children }: { label: string; children: ReactNode }) {
  return (
    <div className="flex gap-3 lg:block">
      <dt className="w-24 shrink-0 text-ink-soft lg:sr-only">{label}</dt>
      <dd className="min-w-0">{children}</dd>
    </div>
  )
}

function Line({ item }: { item: Item }) {
  const title = `${item.projectName}, ${item.facadeName}`
  return (
    <li className="border-t border-rule first:border-t-0">
      <article aria-label={title} className={`px-4 py-4 ${COLUMNS}`}>
        <div className="min-w-0 pb-3 lg:pb-0">
          <h2 className="font-heading text-xl leading-tight break-words">{item.projectName}</h2>
          <p className="break-words text-ink-soft">{item.facadeName}</p>
        </div>
        <dl className="grid gap-2 lg:contents">
          <Cell label="Stage"><StageBadge stage={item.stage} /></Cell>
          <Cell label="Findings"><FindingCounts counts={item.counts} /></Cell>
          <Cell label="Plants"><span className="font-mono">{item.placements}</span></Cell>
          <Cell label="Drawn last">{item.updatedBy && <span className="block">{item.updatedBy}</span>}<span className="block text-ink-soft"><When at={item.updatedAt} /></span></Cell>
        </dl>
        <LinkButton href={`/projects/${item.projectId}/facades/${item.facadeId}`} aria-label={`Look at ${title}`} className="mt-3 w-full lg:mt-0">Look at it</LinkButton>
      </article>
    </li>
  )
}

const HEADS = ['Facade', 'Stage', 'Findings', 'Plants', 'Drawn last', '']

/** The facades that want a second look, each with the way to its drawing. */
export function QueueList({ items }: { items: readonly Item[] }) {
  return (
    <div className="border border-rule bg-sheet">
      <div aria-hidden="true" className={`hidden border-b border-ink px-4 py-2 text-sm font-bold ${COLUMNS}`}>
        {HEADS.map((head) => <span key={head}>{head}</span>)}
      </div>
      <ol>{items.map((item) => <Line key={item.facadeId} item={item} />)}</ol>
    </div>
  )
}
