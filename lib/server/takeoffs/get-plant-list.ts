import { buildPlantList, takeOffBeds, type BedsTakeoff, type PlantListRow } from '@/lib/takeoff'
import { authorize } from '../authorize'
import type { Context } from '../context'
import { getSheet } from '../sheets/get-sheet'

export interface PlantList {
  facade: { id: string; name: string; projectId: string; projectName: string }
  rows: PlantListRow[]
  beds: BedsTakeoff
}

/** The plant list of one facade, counted from what was saved last. Throws AppError('not-found'). */
export function getPlantList(context: Context, { facadeId }: { facadeId: string }): PlantList {
  authorize(context, 'takeoff:read')
  const { facade, sheet } = getSheet(context, { facadeId })
  return { facade, rows: buildPlantList(sheet), beds: takeOffBeds(sheet) }
}
