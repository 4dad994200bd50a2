import type { Metadata } from 'next'
import { ClientGarden } from '@/components/client/client-garden'
import { readShown } from '@/components/client/view-state'
import { getClientView } from '@/lib/server/clients/get-client-view'
import { requireContext } from '@/lib/server/people/require-context'

export const metadata: Metadata = { title: 'Your garden' }

interface Props {
  searchParams: Promise<Record<string, string | string[] | undefined>>
}

/** The client's page: each house front with its plants, through years and seasons. Nothing internal reaches it. */
export default async function ClientViewPage({ searchParams }: Props) {
  const context = await requireContext('client')
  const { studio, project, facades } = getClientView(context)
  const fronts = facades.map(({ id, name, sheet }) => ({ id, name, sheet: { ...sheet, placements: sheet.placements.filter(({ status }) => status !== 'goes') } }))
  const shown = readShown(await searchParams)
  return (
    <main className="mx-auto min-h-dvh max-w-5xl bg-paper text-ink">
      <header className="border-b border-rule px-4 pt-5 pb-4">
        <p className="text-ink-soft">{studio.name}</p>
        <h1 className="mt-1 font-heading text-3xl leading-tight break-words">{project.name}</h1>
        <p className="mt-2">Your house front with its new plants, from planting day to twenty years on. Sizes are what we expect; each garden grows a little differently.</p>
      </header>
      {fronts.length === 0 ? <NothingYet studio={studio.name} /> : <ClientGarden facades={fronts} shown={shown} />}
    </main>
  )
}

function NothingYet({ studio }: { studio: string }) {
  return (
    <section className="px-4 py-8">
      <h2 className="font-heading text-2xl">The drawing is still on the table</h2>
      <p className="mt-2">Here you will see your house front with the plants on it, and how they grow. {studio} is measuring and choosing; come back by the same link.</p>
    </section>
  )
}
