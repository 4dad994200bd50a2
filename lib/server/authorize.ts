import { can, type Permission } from '@/lib/access'
import { AppError } from '@/lib/errors'
import type { Context } from './context'

/** Lets the operation go on, or throws AppError('forbidden'): the first line of every operation. */
export function authorize({ actor }: Pick<Context, 'actor'>, permission: Permission): void {
  if (!can(actor.role, permission)) throw new AppError('forbidden')
}
