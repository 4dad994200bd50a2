import type { Metadata } from 'next'
import { redirect } from 'next/navigation'
import { QueueTable } from '@/components/review/queue-table'
import { EmptyState, PageHeader } from '@/components/ui'
import { can } from '@/lib/access'
import { requireContext } from '@/lib/server/people/require-context'
import { listQueue } from '@/lib/server/reviews/list-queue'

export const metadata: Metadata = { title: 'Review' }

export default async function ReviewPage() {
  const context = await requireContext('member')
  if (!can(context.actor.role, 'review:queue')) redirect('/projects')
  const waiting = listQueue(context).filter(({ counts }) => counts.conflict + counts.risk + counts.held > 0)
  return (
    <main className="mx-auto grid max-w-7xl grid-cols-1 gap-5 px-4 py-6">
      <PageHeader title="Review">Facades on which something outgrows its place, most conflicts first.</PageHeader>
      {waiting.length === 0
        ? <EmptyState title="Nothing outgrows its place">Facades with conflicts, risks or held plants are listed here.</EmptyState>
        : <QueueTable items={waiting} />}
    </main>
  )
}
