import type { Metadata, Route } from 'next'
import Link from 'next/link'
import { PLAIN, STRONG } from '@/components/plants/parts'
import { Pager } from '@/components/plants/pager'
import { PlantFilters } from '@/components/plants/plant-filters'
import { PlantTable } from '@/components/plants/plant-table'
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
    <div className="rounded-sm border border-rule bg-sheet p-8 text-center">
      <p className="font-heading text-2xl">No plant fits all of this</p>
      <p className="mt-2 text-ink-soft">{owner === 'own' && canEdit ? 'Plants your studio adds or brings in stand here.' : 'Take away a filter, or try fewer letters of the name.'}</p>
      <Link href={'/plants' as Route} className={`${PLAIN} mt-4`}>Show every plant</Link>
    </div>
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
    <main className="grid gap-4 px-4 py-6">
      <div className="flex flex-wrap items-center justify-between gap-3">
        <h1 className="font-heading text-3xl">Plants</h1>
        {canEdit && (
          <div className="flex flex-wrap gap-3">
            <Link href={'/plants/import' as Route} className={PLAIN}>Import plants</Link>
            <Link href={'/plants/new' as Route} className={STRONG}>Add a plant</Link>
          </div>
        )}
      </div>
      <PlantFilters query={query} problems={problems} typed={bad} />
      <p role="status" className="text-lg">{count}{problems.length > 0 && '. What could not be read was left out.'}</p>
      {total === 0 ? <Nothing canEdit={canEdit} owner={query.owner} /> : <PlantTable plants={plants} query={query} caption={`${count}, page ${page} of ${pages}`} />}
      <Pager query={query} page={page} pages={pages} />
    </main>
  )
}
