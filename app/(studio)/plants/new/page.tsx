import type { Metadata, Route } from 'next'
import { redirect } from 'next/navigation'
import { PlantForm } from '@/components/plants/plant-form'
import { can } from '@/lib/access'
import { requireContext } from '@/lib/server/people/require-context'
import { createPlantAction } from '../actions'

export const metadata: Metadata = { title: 'Add a plant' }

export default async function NewPlantPage() {
  const { actor } = await requireContext()
  if (!can(actor.role, 'plant:edit')) redirect('/plants' as Route)
  return (
    <main className="px-4 py-6">
      <h1 className="font-heading text-3xl">Add a plant</h1>
      <p className="mb-4 max-w-prose text-ink-soft">It stands in your studio’s library beside the shared plants. Nobody outside the studio sees it.</p>
      <PlantForm save={createPlantAction} back="/plants" />
    </main>
  )
}
