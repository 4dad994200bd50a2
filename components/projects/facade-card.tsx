import type { ReactNode } from 'react'
import { FindingCounts } from '@/components/findings/finding-counts'
import { LinkButton, When } from '@/components/ui'
import type { FindingKind } from '@/lib/spacing'

export interface FacadeLine {
  id: string
  name: string
  placements: number
  counts: Readonly<Record<FindingKind, number>>
  updatedAt: number
}

interface Props {
  projectId: string
  facade: FacadeLine
  picture: ReactNode
  /** The ways to rename and remove it; nothing for those who only read. */
  tools?: ReactNode
  canEdit: boolean
}

const plantsText = (count: number) => (count === 0 ? 'Nothing planted yet' : count === 1 ? 'One plant' : `${count} plants`)

/** One house front: its picture, what the check says of it, and the ways in. */
export function FacadeCard({ projectId, facade, picture, tools, canEdit }: Props) {
  const path = `/projects/${projectId}/facades/${facade.id}`
  return (
    <article aria-label={facade.name} className="flex h-full flex-col border border-rule bg-sheet">
      <div className="flex aspect-[2.3] items-end border-b border-rule bg-paper px-4 pt-3">{picture}</div>
      <div className="grid flex-1 content-start gap-2 p-4">
        <h3 className="font-heading text-xl leading-tight break-words">{facade.name}</h3>
        <p className="text-ink-soft">{plantsText(facade.placements)}. Changed <When at={facade.updatedAt} />.</p>
        {facade.placements > 0 && <FindingCounts counts={facade.counts} />}
      </div>
      <div className="flex flex-wrap gap-3 px-4 pb-4">
        <LinkButton href={path} variant="primary" aria-label={`${canEdit ? 'Draw' : 'Drawing of'} ${facade.name}`}>{canEdit ? 'Draw' : 'Drawing'}</LinkButton>
        <LinkButton href={`${path}/measure`} aria-label={`${canEdit ? 'Measure' : 'Measures of'} ${facade.name}`}>{canEdit ? 'Measure' : 'Measures'}</LinkButton>
        <LinkButton href={`${path}/plant-list`} aria-label={`Plant list of ${facade.name}`}>Plant list</LinkButton>
      </div>
      {tools && <div className="flex flex-wrap gap-3 border-t border-rule px-4 py-2">{tools}</div>}
    </article>
  )
}
