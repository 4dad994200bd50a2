import type { Metadata } from 'next'
import { redirect } from 'next/navigation'
import { QueueList } from '@/components/review/queue-list'
import { EmptyState, LinkButton, PageHeader } from '@/components/ui'
import { can } from '@/lib/access'
import { requireContext } from '@/lib/server/people/require-context'
import { listQueue } from '@/lib/server/reviews/list-queue'
import { FINDING_KINDS } from '@/lib/spacing'

export const metadata: Metadata = { title: 'Review' }

const quietText = (count: number) => (count === 1 ? 'One other facade has nothing to report.' : `${count} other facades have nothing to report.`)

export default async function ReviewPage() {
  const context = await requireContext('member')
  if (!can(context.actor.role, 'review:queue')) redirect('/projects')
  const all = listQueue(context)
  const waiting = all.filter(({ counts }) => FINDING_KINDS.some((kind) => counts[kind] > 0))
  const quiet = all.length - waiting.length
  return (
    <main className="mx-auto grid max-w-[90rem] grid-cols-1 gap-5 px-4 py-6">
      <PageHeader title="Review">Facades on which the check found something, most conflicts first.</PageHeader>
      {waiting.length === 0
        ? <EmptyState title="Nothing to look at" action={<LinkButton href="/projects">Go to the projects</LinkButton>}>Facades with conflicts, risks, held plants or notes are listed here.</EmptyState>
        : <QueueList items={waiting} />}
      {waiting.length > 0 && quiet > 0 && <p className="text-ink-soft">{quietText(quiet)}</p>}
    </main>
  )
}
