import type { Metadata } from 'next'
import { StandardsForm } from '@/components/standards/standards-form'
import { PageHeader } from '@/components/ui'
import { can } from '@/lib/access'
import { requireContext } from '@/lib/server/people/require-context'
import { getStandards } from '@/lib/server/standards/get-standards'
import { saveStandardsAction } from './actions'

export const metadata: Metadata = { title: 'Standards' }

/** The studio's standards, read by everyone of it and set by its owner. */
export default async function StandardsPage() {
  const context = await requireContext('member')
  const { values } = getStandards(context)
  const canEdit = can(context.actor.role, 'standards:edit')
  return (
    <main className="mx-auto grid max-w-7xl grid-cols-1 gap-5 px-4 py-6">
      <PageHeader title="Standards">
        What the check asks, by which figures, and where they come from. {canEdit ? 'Set your own where your studio builds otherwise; every facade is then checked anew.' : 'The owner of the studio sets them.'} Figures from codes are reminders: local code and licensed practice decide.
      </PageHeader>
      <StandardsForm values={values} canEdit={canEdit} action={saveStandardsAction.bind(null, values)} />
    </main>
  )
}
