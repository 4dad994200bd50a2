import type { Metadata, Route } from 'next'
import { redirect } from 'next/navigation'
import { SignInForm } from '@/components/people/sign-in-form'
import { sitePath } from '@/lib/server/http/site-path'
import { anonymousContext } from '@/lib/server/people/anonymous-context'
import { listDemoSignIns } from '@/lib/server/people/list-demo-sign-ins'
import { readActor } from '@/lib/server/people/session'
import { signInAction } from './actions'

export const metadata: Metadata = { title: 'Sign in' }

interface Props {
  searchParams: Promise<{ next?: string | string[] }>
}

/** The studio's door. A client may stand here too: a member who tried a client's link comes back this way. */
export default async function SignInPage({ searchParams }: Props) {
  const next = sitePath((await searchParams).next)
  const actor = await readActor()
  if (actor?.kind === 'member') redirect((next ?? '/projects') as Route)
  return (
    <main className="mx-auto flex min-h-dvh max-w-md flex-col justify-center px-5 py-10">
      <p className="border-b border-ink pb-1 font-heading text-lg italic">Tenth Summer</p>
      <h1 className="mt-6 font-heading text-4xl leading-tight">Sign in</h1>
      <p className="mt-2 text-balance text-ink-soft">House fronts drawn with their plants at the size they grow to.</p>
      <div className="mt-6 border border-rule bg-sheet p-5">
        <SignInForm action={signInAction} next={next} demo={listDemoSignIns(anonymousContext())} />
      </div>
      <p className="mt-5 text-ink-soft">Came for your own garden? Open the link your designer sent you; it needs no password.</p>
    </main>
  )
}
