/**
 * Who may do what: one table, read by the button and by the server.
 * A permission string is `thing:deed`. Every operation in lib/server asks `can` before it reads or writes.
 */

export const ROLES = ['owner', 'designer', 'reviewer', 'estimator', 'client'] as const
export type Role = (typeof ROLES)[number]
export type MemberRole = Exclude<Role, 'client'>

const TABLE = {
  'project:list': ['owner', 'designer', 'reviewer', 'estimator'],
  'project:read': ['owner', 'designer', 'reviewer', 'estimator'],
  'project:create': ['owner', 'designer'],
  'project:edit': ['owner', 'designer'],
  'sheet:read': ['owner', 'designer', 'reviewer', 'estimator'],
  'sheet:edit': ['owner', 'designer'],
  'sheet:check': ['owner', 'designer', 'reviewer', 'estimator'],
  'review:queue': ['owner', 'designer', 'reviewer'],
  'takeoff:read': ['owner', 'designer', 'reviewer', 'estimator'],
  'standards:read': ['owner', 'designer', 'reviewer', 'estimator'],
  'standards:edit': ['owner'],
  'plant:read': ['owner', 'designer', 'reviewer', 'estimator'],
  'plant:edit': ['owner', 'designer'],
  'client-link:create': ['owner', 'designer'],
  'client-view:read': ['client'],
  'own-password:change': ['owner', 'designer', 'reviewer', 'estimator'],
} as const satisfies Record<string, readonly Role[]>

export type Permission = keyof typeof TABLE
export const PERMISSIONS = Object.keys(TABLE) as Permission[]

/**
 * May someone of this role do this?
 * @example can('reviewer', 'sheet:edit') // false
 */
export function can(role: Role, permission: Permission): boolean {
  return (TABLE[permission] as readonly Role[]).includes(role)
}

export { MAX_PASSWORD, MIN_PASSWORD, passwordProblem } from './password-problem'
