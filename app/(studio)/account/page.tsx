import type { Metadata } from 'next'
import { PasswordForm } from '@/components/people/password-form'
import { PageHeader } from '@/components/ui'
import { requireContext } from '@/lib/server/people/require-context'
import { changePasswordAction } from './actions'

export const metadata: Metadata = { title: 'Account' }

const DEEDS: Record<string, string> = {
  owner: 'Owner: you draw, check, list and share everything of the studio.',
  designer: 'Designer: you measure, draw, check and share with clients.',
  reviewer: 'Reviewer: you read every sheet and its findings; you change nothing.',
  estimator: 'Estimator: you read the sheets and take the plant lists.',
}

/** Who one is here, and one's password. */
export default async function AccountPage() {
  const { actor } = await requireContext('member')
  const email = actor.kind === 'member' ? actor.email : ''
  return (
    <main className="mx-auto grid max-w-3xl gap-8 px-4 py-6">
      <PageHeader title="Account">{DEEDS[actor.role]}</PageHeader>
      <dl className="grid gap-x-6 gap-y-2 sm:grid-cols-[auto_1fr]">
        <dt className="text-ink-soft">Name</dt>
        <dd className="break-words">{actor.name}</dd>
        <dt className="text-ink-soft">E-mail address</dt>
        <dd className="break-words">{email}</dd>
      </dl>
      <section aria-labelledby="password-title">
        <h2 id="password-title" className="font-heading text-2xl">Change your password</h2>
        <div className="mt-4">
          <PasswordForm email={email} action={changePasswordAction} />
        </div>
      </section>
    </main>
  )
}
