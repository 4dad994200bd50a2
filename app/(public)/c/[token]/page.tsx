import type { Metadata } from 'next'
import { AppError } from '@/lib/errors'
import { findClientLink } from '@/lib/server/clients/find-client-link'
import { anonymousContext } from '@/lib/server/people/anonymous-context'
import { openGarden } from './open-garden'

export const metadata: Metadata = { title: 'An invitation to your garden', robots: { index: false } }

interface Props {
  params: Promise<{ token: string }>
}

/** Who invites to what, or null for a link that is unknown, expired or revoked: one answer for all three. */
function invitationOf(token: string) {
  try {
    return findClientLink(anonymousContext(), { token })
  } catch (error) {
    if (error instanceof AppError && error.code === 'not-found') return null
    throw error
  }
}

/** The page behind a client's link. Looking at it changes nothing; its one button signs in. */
export default async function ClientLinkPage({ params }: Props) {
  const { token } = await params
  const invitation = invitationOf(token)
  return (
    <main className="mx-auto flex min-h-dvh max-w-md flex-col justify-center bg-paper px-5 py-10 text-ink">
      {invitation ? (
        <>
          <p className="text-ink-soft">{invitation.studioName} invites you to see</p>
          <h1 className="mt-1 font-heading text-3xl leading-tight break-words">{invitation.projectName}</h1>
          <p className="mt-4">Your house front with its new plants, on planting day and in the years after. It is yours alone to see; you need no password.</p>
          <form action={openGarden} className="mt-6">
            <input type="hidden" name="token" value={token} />
            <button type="submit" className="min-h-12 w-full rounded bg-leaf px-5 text-lg font-bold text-sheet">Show me the garden</button>
          </form>
        </>
      ) : (
        <>
          <h1 className="font-heading text-3xl leading-tight">This link is no longer good</h1>
          <p className="mt-4">Ask your designer for a new one.</p>
        </>
      )}
    </main>
  )
}
