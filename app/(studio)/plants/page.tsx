import type { Metadata } from 'next'
import { Pager } from '@/components/plants/pager'
import { PlantFilters } from '@/components/plants/plant-filters'
import { PlantTable } from '@/components/plants/plant-table'
import { EmptyState, LinkButton, PageHeader } from '@/components/ui'
import { can } from '@/lib/access'
import { isNarrowed, readPlantQuery } from '@/lib/plants'
import { requireContext } from '@/lib/server/people/require-context'
import { searchPlants } from '@/lib/server/plants/search-plants'

export const metadata: Metadata = { title: 'Plants' }

type Params = Record<string, string | string[] | undefined>

const countText = (total: number, narrowed: boolean) =>
  `${total.toLocaleString('en-US')} ${total === 1 ? 'plant' : 'plants'}${narrowed ? (total === 1 ? ' fits' : ' fit') : ' in the library'}`

function Nothing({ canEdit, owner }: { canEdit: boolean; owner: string }) {
  return (
    <EmptyState title="No plant fits all of this" action={<LinkButton href="/plants">Show every plant</LinkButton>}>
      {owner === 'own' && canEdit ? 'Plants your studio adds or brings in stand here.' : 'Take away a filter, or try fewer letters of the name.'}
    </EmptyState>
  )
}

export default async function PlantsPage({ searchParams }: { searchParams: Promise<Params> }) {
  const context = await requireContext()
  const typed = await searchParams
  const { query, problems } = readPlantQuery(typed)
  const { plants, total, page, pages } = searchPlants(context, query)
  const canEdit = can(context.actor.role, 'plant:edit')
  const count = countText(total, isNarrowed(query))
  const bad = Object.fromEntries(problems.map(({ field }) => [field, String(typed[field] ?? '')]))
  return (
    <main className="mx-auto grid max-w-[90rem] grid-cols-1 gap-4 px-4 py-6">
      <PageHeader title="Plants" actions={canEdit && <><LinkButton href="/plants/import">Import plants</LinkButton><LinkButton href="/plants/new" variant="primary">Add a plant</LinkButton></>} />
      <PlantFilters query={query} problems={problems} typed={bad} />
      <p role="status" className="text-lg">{count}{problems.length > 0 && '. What could not be read was left out.'}</p>
      {total === 0 ? <Nothing canEdit={canEdit} owner={query.owner} /> : <PlantTable plants={plants} query={query} caption={`${count}, page ${page} of ${pages}`} />}
      <Pager query={query} page={page} pages={pages} />
    </main>
  )
}
