import type { Metadata, Route } from 'next'
import { redirect } from 'next/navigation'
import { PlantImport } from '@/components/plants/plant-import'
import { PageHeader } from '@/components/ui'
import { can } from '@/lib/access'
import { requireContext } from '@/lib/server/people/require-context'

export const metadata: Metadata = { title: 'Import plants' }

export default async function ImportPlantsPage() {
  const { actor } = await requireContext()
  if (!can(actor.role, 'plant:edit')) redirect('/plants' as Route)
  return (
    <main className="mx-auto grid max-w-7xl grid-cols-1 gap-4 px-4 py-6">
      <PageHeader title="Import plants" crumbs={[{ href: '/plants', label: 'Plants' }]}>
        One plant a line, headed as in the template. Sizes are in inches, or say their unit; lists have | between; months read 6-9, or 11-2 over the turn of the year.
      </PageHeader>
      <PlantImport />
    </main>
  )
}
