import type { SceneOptions } from '@/lib/drawing'

/** A sheet as a client may have it: no findings, no standards, no notes. */
export type ClientSheet = SceneOptions['sheet']

export interface ClientFacade {
  id: string
  name: string
  sheet: ClientSheet
}
