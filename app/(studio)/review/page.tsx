import type { Metadata } from 'next'
import { redirect } from 'next/navigation'
import { QueueTable } from '@/components/review/queue-table'
import { Button, EmptyState, LinkButton, PageHeader, TextField } from '@/components/ui'
import { can } from '@/lib/access'
import { requireContext } from '@/lib/server/people/require-context'
import { listQueue } from '@/lib/server/reviews/list-queue'

export const metadata: Metadata = { title: 'Review' }

interface Props {
  searchParams: Promise<{ q?: string | string[] }>
}

const LONG_LIST = 20

/** The facades with findings; a long list can be searched by project and facade. */
export default async function ReviewPage({ searchParams }: Props) {
  const context = await requireContext('member')
  if (!can(context.actor.role, 'review:queue')) redirect('/projects')
  const typed = [(await searchParams).q ?? ''].flat()[0]!.trim()
  const wanted = typed.toLocaleLowerCase('en-US')
  const waiting = listQueue(context).filter(({ counts }) => Object.values(counts).some((count) => count > 0))
  const shown = waiting.filter(({ projectName, facadeName }) => `${projectName} ${facadeName}`.toLocaleLowerCase('en-US').includes(wanted))
  return (
    <main className="mx-auto grid max-w-7xl grid-cols-1 gap-5 px-4 py-6">
      <PageHeader title="Review">Facades with findings, most conflicts first.</PageHeader>
      {(waiting.length > LONG_LIST || typed !== '') && (
        <form role="search" className="flex flex-wrap items-end gap-3">
          <TextField type="search" name="q" label="Find a facade" defaultValue={typed} className="w-full max-w-md" />
          <Button type="submit">Find</Button>
        </form>
      )}
      {waiting.length === 0 && <EmptyState title="Nothing to look at" action={<LinkButton href="/projects">To the projects</LinkButton>}>Facades are listed here as soon as the check finds something on them.</EmptyState>}
      {waiting.length > 0 && shown.length === 0 && <EmptyState title="No facade fits that" action={<LinkButton href="/review">Show every facade</LinkButton>}>Try fewer letters.</EmptyState>}
      {shown.length > 0 && <QueueTable items={shown} />}
    </main>
  )
}
