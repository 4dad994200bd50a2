import type { Metadata, Route } from 'next'
import { redirect } from 'next/navigation'
import { PlantForm } from '@/components/plants/plant-form'
import { PageHeader } from '@/components/ui'
import { can } from '@/lib/access'
import { requireContext } from '@/lib/server/people/require-context'
import { createPlantAction } from '../actions'

export const metadata: Metadata = { title: 'Add a plant' }

export default async function NewPlantPage() {
  const { actor } = await requireContext()
  if (!can(actor.role, 'plant:edit')) redirect('/plants' as Route)
  return (
    <main className="mx-auto grid max-w-7xl grid-cols-1 gap-4 px-4 py-6">
      <PageHeader title="Add a plant" crumbs={[{ href: '/plants', label: 'Plants' }]}>It stands in your studio’s library beside the shared plants. Nobody outside the studio sees it.</PageHeader>
      <PlantForm save={createPlantAction} back="/plants" />
    </main>
  )
}
