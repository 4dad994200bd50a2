'use server'
import type { Route } from 'next'
import { headers } from 'next/headers'
import { redirect } from 'next/navigation'
import { callerAddress } from '@/lib/server/http/caller-address'
import { runAction } from '@/lib/server/http/run-action'
import { changePassword } from '@/lib/server/people/change-password'
import { requireContext } from '@/lib/server/people/require-context'
import { readSessionSecret } from '@/lib/server/people/session'
import { signOut } from '@/lib/server/people/sign-out'

/** What the password form shows after an attempt. */
export interface PasswordState {
  isDone: boolean
  /** What is wrong as a whole; null when each fault stands at its field. */
  error: string | null
  fields: { current?: string; next?: string; again?: string }
}

const textOf = (form: FormData, name: string) => {
  const value = form.get(name)
  return typeof value === 'string' ? value : ''
}

/** Gives the person a new password; their other devices are signed out. */
export async function changePasswordAction(_before: PasswordState, form: FormData): Promise<PasswordState> {
  const context = await requireContext('member')
  const [current, next, again] = [textOf(form, 'current'), textOf(form, 'next'), textOf(form, 'again')]
  if (next !== again) return { isDone: false, error: null, fields: { again: 'The two new passwords differ.' } }
  const request = { address: callerAddress(await headers()), secret: (await readSessionSecret()) ?? '' }
  const answer = await runAction('change password', () => changePassword(context, { current, next, ...request }))
  if (answer.ok) return { isDone: true, error: null, fields: {} }
  const fields = Object.fromEntries((answer.error.problems ?? []).map(({ path, message }) => [String(path[0]), message]))
  return { isDone: false, error: Object.keys(fields).length > 0 ? null : answer.error.message, fields }
}

/** Ends the session of this browser. */
export async function signOutAction(): Promise<void> {
  await signOut()
  redirect('/sign-in' as Route)
}
