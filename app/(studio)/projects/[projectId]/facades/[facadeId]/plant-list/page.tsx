import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { BedsTable } from '@/components/takeoff/beds-table'
import { PlantListTable } from '@/components/takeoff/plant-list-table'
import { buttonClass, EmptyState, LinkButton, PageHeader } from '@/components/ui'
import { AppError } from '@/lib/errors'
import type { Context } from '@/lib/server/context'
import { requireContext } from '@/lib/server/people/require-context'
import { getPlantList } from '@/lib/server/takeoffs/get-plant-list'

export const metadata: Metadata = { title: 'Plant list' }

interface Props {
  params: Promise<{ projectId: string; facadeId: string }>
}

function readList(context: Context, projectId: string, facadeId: string) {
  try {
    const found = getPlantList(context, { facadeId })
    return found.facade.projectId === projectId ? found : null
  } catch (error) {
    if (error instanceof AppError && error.code === 'not-found') return null
    throw error
  }
}

export default async function PlantListPage({ params }: Props) {
  const { projectId, facadeId } = await params
  const found = readList(await requireContext('member'), projectId, facadeId)
  if (!found) notFound()
  const { facade, rows, beds } = found
  const table = `/projects/${projectId}/facades/${facadeId}`
  const file = `/api/facades/${facadeId}/plant-list`
  const crumbs = [{ href: '/projects', label: 'Projects' }, { href: `/projects/${projectId}`, label: facade.projectName }, { href: table, label: facade.name }]
  return (
    <main className="mx-auto grid max-w-7xl grid-cols-1 gap-4 px-4 py-6">
      <PageHeader
        title="Plant list" crumbs={crumbs}
        actions={rows.length > 0 && <><a href={file} download className={buttonClass()}>Download CSV</a><a href={`${file}?bom=1`} download className={buttonClass()}>Download CSV for spreadsheets</a></>}
      >
        Counted from the drawing as it was saved last. {rows.length > 0 && 'Spreadsheets that show odd signs instead of × or accents want the second file: it begins with a byte order mark.'}
      </PageHeader>
      {rows.length === 0
        ? <EmptyState title="Nothing to count yet" action={<LinkButton href={table} variant="primary">Open the drawing table</LinkButton>}>Plants placed on this facade are counted here.</EmptyState>
        : <PlantListTable rows={rows} />}
      {beds.beds.length > 0 && <BedsTable takeoff={beds} />}
    </main>
  )
}
