import { FindingCounts } from '@/components/findings/finding-counts'
import { LinkButton, When, WideTable } from '@/components/ui'
import { STAGE_WORDS, type Stage } from '@/lib/project'
import type { FindingKind } from '@/lib/spacing'

interface Item {
  facadeId: string
  facadeName: string
  projectId: string
  projectName: string
  stage: Stage
  counts: Record<FindingKind, number>
  placements: number
  updatedAt: number
  /** Who drew last; null when nothing was drawn. */
  updatedBy: string | null
}

/** The facades that want a second look, each with the way to its drawing. */
export function QueueTable({ items }: { items: readonly Item[] }) {
  return (
    <WideTable label="Facades to review" className="border border-rule bg-sheet">
      <table className="w-full border-collapse">
        <thead>
          <tr>{['Project', 'Facade', 'Stage', 'Findings', 'Plants', 'Drawn last', ''].map((head) => <th key={head} scope="col" className="px-3 py-2 text-left">{head || <span className="sr-only">Drawing</span>}</th>)}</tr>
        </thead>
        <tbody>
          {items.map((item) => (
            <tr key={item.facadeId} className="border-t border-rule">
              <th scope="row" className="px-3 py-2 text-left font-heading text-lg font-normal">{item.projectName}</th>
              <td className="px-3 py-2">{item.facadeName}</td>
              <td className="px-3 py-2">{STAGE_WORDS[item.stage]}</td>
              <td className="px-3 py-2"><FindingCounts counts={item.counts} isPlanted={item.placements > 0} /></td>
              <td className="px-3 py-2 font-mono tabular-nums">{item.placements}</td>
              <td className="px-3 py-2 whitespace-nowrap">{item.updatedBy && <span className="block">{item.updatedBy}</span>}<span className="block text-ink-soft"><When at={item.updatedAt} to="minute" /></span></td>
              <td className="px-3 py-2"><LinkButton href={`/projects/${item.projectId}/facades/${item.facadeId}`} aria-label={`Look at ${item.projectName}, ${item.facadeName}`}>Look</LinkButton></td>
            </tr>
          ))}
        </tbody>
      </table>
    </WideTable>
  )
}
