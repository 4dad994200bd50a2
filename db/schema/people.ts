import { sql } from 'drizzle-orm'
import { check, index, integer, primaryKey, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core'
import type { MemberRole } from '../../lib/access'
import { createdAt, id } from './columns'
import { projects } from './projects'

export const studios = sqliteTable('studios', {
  id: id(),
  name: text('name').notNull(),
  createdAt: createdAt(),
})

/** Anyone who can be signed in: members of a studio by e-mail and password, clients by a link. */
export const people = sqliteTable(
  'people',
  {
    id: id(),
    /** Lower case; null for clients, who have no password and sign in by link. */
    email: text('email'),
    name: text('name').notNull(),
    passwordHash: text('password_hash'),
    createdAt: createdAt(),
  },
  (t) => [uniqueIndex('people_email').on(t.email), check('people_email_lower', sql`${t.email} = lower(${t.email})`)],
)

export const members = sqliteTable(
  'members',
  {
    studioId: text('studio_id').notNull().references(() => studios.id, { onDelete: 'cascade' }),
    personId: text('person_id').notNull().references(() => people.id, { onDelete: 'cascade' }),
    role: text('role').$type<MemberRole>().notNull(),
    createdAt: createdAt(),
  },
  (t) => [
    primaryKey({ columns: [t.studioId, t.personId] }),
    index('members_person').on(t.personId),
    check('members_role', sql`${t.role} in ('owner', 'designer', 'reviewer', 'estimator')`),
  ],
)

/** The reader of one project's client page. */
export const clients = sqliteTable(
  'clients',
  {
    id: id(),
    studioId: text('studio_id').notNull().references(() => studios.id, { onDelete: 'cascade' }),
    projectId: text('project_id').notNull().references(() => projects.id, { onDelete: 'cascade' }),
    personId: text('person_id').notNull().references(() => people.id, { onDelete: 'cascade' }),
    createdAt: createdAt(),
  },
  (t) => [index('clients_project').on(t.projectId), uniqueIndex('clients_person').on(t.personId)],
)

/** Sessions as Lucia keeps them; `id` is the SHA-256 of what the cookie holds, so a stolen table signs nobody in. */
export const sessions = sqliteTable(
  'sessions',
  {
    id: id(),
    userId: text('user_id').notNull().references(() => people.id, { onDelete: 'cascade' }),
    /** Seconds since 1970: the adapter's unit. */
    expiresAt: integer('expires_at').notNull(),
    studioId: text('studio_id').notNull().references(() => studios.id, { onDelete: 'cascade' }),
    /** Set for a client's session: the one project it opens. */
    projectId: text('project_id').references(() => projects.id, { onDelete: 'cascade' }),
  },
  (t) => [index('sessions_user').on(t.userId)],
)

/** Links that sign a client in to one project. Only the hash of the token is kept. */
export const signInLinks = sqliteTable(
  'sign_in_links',
  {
    id: id(),
    tokenHash: text('token_hash').notNull(),
    studioId: text('studio_id').notNull().references(() => studios.id, { onDelete: 'cascade' }),
    projectId: text('project_id').notNull().references(() => projects.id, { onDelete: 'cascade' }),
    clientId: text('client_id').notNull().references(() => clients.id, { onDelete: 'cascade' }),
    expiresAt: integer('expires_at').notNull(),
    revokedAt: integer('revoked_at'),
    createdBy: text('created_by').notNull().references(() => people.id),
    createdAt: createdAt(),
  },
  (t) => [uniqueIndex('sign_in_links_token').on(t.tokenHash), index('sign_in_links_project').on(t.projectId)],
)

/** Counted attempts, as rate-limiter-flexible keeps them. */
export const rateLimits = sqliteTable('rate_limits', {
  key: text('key').primaryKey(),
  points: integer('points').notNull().default(0),
  expire: integer('expire'),
})

/** Who did what when, for one project. */
export const activity = sqliteTable(
  'activity',
  {
    id: id(),
    studioId: text('studio_id').notNull().references(() => studios.id, { onDelete: 'cascade' }),
    projectId: text('project_id').references(() => projects.id, { onDelete: 'cascade' }),
    personId: text('person_id').references(() => people.id),
    deed: text('deed').notNull(),
    detail: text('detail').notNull().default(''),
    at: integer('at').notNull(),
  },
  (t) => [index('activity_project').on(t.projectId, t.at)],
)
