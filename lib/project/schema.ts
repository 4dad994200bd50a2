/** What a project's form holds: the same schema judges the form and the server. */
import { siteSchema } from '../sheet'
import { z } from '../zod'

const line = (what: string, most: number) => z.string({ error: `${what} is text.` }).trim().max(most, { error: `${what} has at most ${most} characters.` })

const site = siteSchema.pick({ zone: true, moisture: true, deer: true, walnut: true, fireZone: true, latitude: true, longitude: true })

/** A project as people enter it. Light and facing belong to each facade, the rest of the site to the project. */
export const projectInputSchema = site.extend({
  name: line('A name', 80).min(1, { error: 'Give the project a name.' }),
  address: line('An address', 200).default(''),
  clientName: line('A name', 80).default(''),
  brief: siteSchema.shape.brief.default([]),
  notes: line('Notes', 5_000).default(''),
})

export type ProjectInput = z.infer<typeof projectInputSchema>

/** What a facade is called. */
export const facadeNameSchema = line('A name', 80).min(1, { error: 'Give the facade a name.' })
