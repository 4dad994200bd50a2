'use server'
/** What the plant forms ask of the server. Each answers; none redirects, so that nothing typed is lost. */
import type { PlantInput } from '@/lib/plants'
import { runAction } from '@/lib/server/http/run-action'
import { requireContext } from '@/lib/server/people/require-context'
import { createPlant } from '@/lib/server/plants/create-plant'
import { removePlant } from '@/lib/server/plants/remove-plant'
import { savePlant } from '@/lib/server/plants/save-plant'

export async function createPlantAction(plant: PlantInput) {
  const context = await requireContext()
  return runAction('create plant', () => createPlant(context, { plant }))
}

export async function savePlantAction(plantId: string, plant: PlantInput, base: PlantInput | null) {
  const context = await requireContext()
  return runAction('save plant', () => {
    savePlant(context, { plantId: String(plantId), plant, base: base ?? plant })
    return { id: plantId }
  })
}

export async function removePlantAction(plantId: string) {
  const context = await requireContext()
  return runAction('remove plant', () => removePlant(context, { plantId: String(plantId) }))
}
