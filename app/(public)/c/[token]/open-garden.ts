'use server'

import { redirect } from 'next/navigation'
import { AppError } from '@/lib/errors'
import { exchangeClientLink } from '@/lib/server/clients/exchange-client-link'
import { anonymousContext } from '@/lib/server/people/anonymous-context'
import { readSessionSecret, setSessionCookie } from '@/lib/server/people/session'

/** Signs the client in by their link. A link that closed meanwhile leads back to the page, which says so. */
export async function openGarden(form: FormData): Promise<void> {
  const token = String(form.get('token') ?? '')
  const secret = await exchange(token)
  if (secret === null) redirect(`/c/${encodeURIComponent(token) || 'none'}`)
  await setSessionCookie(secret)
  redirect('/view')
}

async function exchange(token: string): Promise<string | null> {
  try {
    return await exchangeClientLink(anonymousContext(), { token, previous: await readSessionSecret() })
  } catch (error) {
    if (error instanceof AppError && error.code === 'not-found') return null
    throw error
  }
}
