import type { Metadata, Route } from 'next'
import Link from 'next/link'
import { redirect } from 'next/navigation'
import { PlantImport } from '@/components/plants/plant-import'
import { can } from '@/lib/access'
import { requireContext } from '@/lib/server/people/require-context'

export const metadata: Metadata = { title: 'Import plants' }

export default async function ImportPlantsPage() {
  const { actor } = await requireContext()
  if (!can(actor.role, 'plant:edit')) redirect('/plants' as Route)
  return (
    <main className="px-4 py-6">
      <Link href={'/plants' as Route} className="inline-flex min-h-11 items-center underline underline-offset-4">Plants</Link>
      <h1 className="font-heading text-3xl">Import plants</h1>
      <p className="mb-4 max-w-prose text-ink-soft">
        One plant a line, headed as in the template. Sizes are in inches, or say their unit; lists have | between; months read 6-9, or 11-2 over the turn of the year.
      </p>
      <PlantImport />
    </main>
  )
}
