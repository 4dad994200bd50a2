'use server'
import type { Route } from 'next'
import { headers } from 'next/headers'
import { redirect } from 'next/navigation'
import { callerAddress } from '@/lib/server/http/caller-address'
import { runAction } from '@/lib/server/http/run-action'
import { sitePath } from '@/lib/server/http/site-path'
import { anonymousContext } from '@/lib/server/people/anonymous-context'
import { readSessionSecret, setSessionCookie } from '@/lib/server/people/session'
import { signIn } from '@/lib/server/people/sign-in'

/** What the form shows after an attempt that failed: the address stays typed, the password does not. */
export interface SignInState {
  email: string
  error: string | null
}

const textOf = (form: FormData, name: string) => {
  const value = form.get(name)
  return typeof value === 'string' ? value : ''
}

/** Signs in and goes on to where the person was headed, or to the projects. */
export async function signInAction(_before: SignInState, form: FormData): Promise<SignInState> {
  const email = textOf(form, 'email').slice(0, 320)
  const password = textOf(form, 'password')
  if (!email.trim() || !password) return { email, error: 'Type your e-mail address and your password.' }
  const address = callerAddress(await headers())
  const answer = await runAction('sign in', async () => {
    const secret = await signIn(anonymousContext(), { email, password, address, previous: await readSessionSecret() })
    await setSessionCookie(secret)
  })
  if (!answer.ok) return { email, error: answer.error.message }
  redirect((sitePath(form.get('next')) ?? '/projects') as Route)
}
