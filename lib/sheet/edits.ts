/**
 * Edits: the only way a sheet changes. An edit puts one whole thing or removes one; undo is its inverse.
 */
import type { Bed, Facade, Fixture, Opening, Placement, Site, Walk } from '../spacing'
import { z } from '../zod'
import { bedSchema, facadeSchema, fixtureSchema, openingSchema, placementSchema, siteSchema, walkSchema } from './schema'

/** What the facade looks towards: the part of the site that is the facade's own. */
export type Aspect = Pick<Site, 'light' | 'facing'>
export const aspectSchema = siteSchema.pick({ light: true, facing: true })

/** Kinds of thing an edit can touch. `facade` and `aspect` stand once on a sheet and are never removed. */
export const EDIT_KINDS = ['facade', 'aspect', 'opening', 'fixture', 'walk', 'bed', 'placement'] as const
export type EditKind = (typeof EDIT_KINDS)[number]
export const LISTED_KINDS = ['opening', 'fixture', 'walk', 'bed', 'placement'] as const
export type ListedKind = (typeof LISTED_KINDS)[number]

export interface ValueOf {
  facade: Facade
  aspect: Aspect
  opening: Opening
  fixture: Fixture
  walk: Walk
  bed: Bed
  placement: Placement
}

export type PutEdit = { [K in EditKind]: { id: string; op: 'put'; kind: K; value: ValueOf[K] } }[EditKind]
export interface RemoveEdit {
  id: string
  op: 'remove'
  kind: ListedKind
  /** Id of the thing removed. */
  target: string
}
/** `id` is a UUID made where the edit was made, so that sending it twice changes nothing twice. */
export type Edit = PutEdit | RemoveEdit

/** Things that stand once on a sheet share one identity. */
export const SINGLE = 'single'

/** Kind and id of the thing an edit touches: edits of one target made apart are in conflict. */
export function targetOf(edit: Edit): { kind: EditKind; target: string } {
  if (edit.op === 'remove') return { kind: edit.kind, target: edit.target }
  if (edit.kind === 'facade' || edit.kind === 'aspect') return { kind: edit.kind, target: SINGLE }
  return { kind: edit.kind, target: edit.value.id }
}

const editId = z.uuid({ error: 'An edit id is a UUID.' })
const put = <K extends EditKind, T extends z.ZodType>(kind: K, value: T) =>
  z.strictObject({ id: editId, op: z.literal('put'), kind: z.literal(kind), value })

/** One edit as it comes over the wire. */
export const editSchema = z.discriminatedUnion('op', [
  z.discriminatedUnion('kind', [
    put('facade', facadeSchema),
    put('aspect', aspectSchema),
    put('opening', openingSchema),
    put('fixture', fixtureSchema),
    put('walk', walkSchema),
    put('bed', bedSchema),
    put('placement', placementSchema),
  ]),
  z.strictObject({ id: editId, op: z.literal('remove'), kind: z.enum(LISTED_KINDS), target: z.string().min(1).max(64) }),
])
