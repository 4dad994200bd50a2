import type { Metadata, Route } from 'next'
import { redirect } from 'next/navigation'
import { BotanicalName } from '@/components/plants/botanical-name'
import { PlantForm } from '@/components/plants/plant-form'
import { PageHeader } from '@/components/ui'
import { can } from '@/lib/access'
import { requireContext } from '@/lib/server/people/require-context'
import { enteredPlantOf } from '@/lib/server/plants/save-plant'
import { savePlantAction } from '../../actions'
import { readPlant } from '../../read-plant'

export const metadata: Metadata = { title: 'Change a plant' }

export default async function EditPlantPage({ params }: { params: Promise<{ plantId: string }> }) {
  const { plantId } = await params
  const context = await requireContext()
  const plant = readPlant(context, plantId)
  if (!can(context.actor.role, 'plant:edit')) redirect('/plants' as Route)
  if (plant.studioId === null) redirect(`/plants/${plantId}` as Route)
  return (
    <main className="mx-auto grid max-w-7xl grid-cols-1 gap-4 px-4 py-6">
      <PageHeader title={<>Change <BotanicalName name={plant.botanical} /></>} crumbs={[{ href: '/plants', label: 'Plants' }, { href: `/plants/${plantId}`, label: plant.botanical }]}>
        Drawings on which it stands are checked again with the new figures.
      </PageHeader>
      <PlantForm plant={enteredPlantOf(plant)} save={savePlantAction.bind(null, plantId)} back={`/plants/${plantId}`} />
    </main>
  )
}
