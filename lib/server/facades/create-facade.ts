import { transact } from '@/db/open'
import { facades } from '@/db/schema'
import { facadeNameSchema } from '@/lib/project'
import { facadeSchema } from '@/lib/sheet'
import type { Facade } from '@/lib/spacing'
import { z } from '@/lib/zod'
import { recordActivity } from '../activity/record-activity'
import { authorize } from '../authorize'
import type { Context } from '../context'
import { parseInput } from '../http/parse'
import { newId } from '../new-id'
import { findProject } from '../projects/find-project'
import { recheck } from '../sheets/freshen-findings'

/** A house front before it was measured: 30 ft of straight wall, one storey to the gutter. Practice; all of it is measured next. */
const UNMEASURED: Facade = {
  wall: [{ x: 0, y: 0 }, { x: 360, y: 0 }],
  grade: [{ x: 0, z: 0 }],
  fall: 0.05, gutter: 108, overhang: 16, siding: 'lap', exposed: 8, mulch: 2,
}

const inputSchema = z.strictObject({
  name: facadeNameSchema,
  width: z.number().gt(0, { error: 'The wall must have a width.' }).optional(),
  gutter: z.number().gt(0, { error: 'The gutter must stand above the soil.' }).optional(),
})

/**
 * Adds a facade to a project; everything on it comes by edits.
 * @param input name, and the width of the wall and the height of the gutter in inches where they are known. Throws AppError('invalid' | 'not-found').
 */
export function createFacade(context: Context, { projectId, ...input }: { projectId: string; name: unknown; width?: unknown; gutter?: unknown }): { id: string } {
  authorize(context, 'project:edit')
  const { db, actor, now } = context
  const { name, width = 360, gutter = UNMEASURED.gutter } = parseInput(inputSchema, input)
  const facade = parseInput(facadeSchema, { ...UNMEASURED, gutter, wall: [{ x: 0, y: 0 }, { x: width, y: 0 }] })
  return transact(db, () => {
    const project = findProject(context, projectId)
    const id = newId()
    const row = { ...facade, id, studioId: actor.studioId, projectId, name, light: 'full-sun' as const, createdAt: now, updatedAt: now }
    recheck(db, { facade: db.insert(facades).values(row).returning().get(), project })
    recordActivity(context, 'facade:create', { projectId, detail: name })
    return { id }
  })
}
