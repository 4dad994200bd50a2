import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { DrawingTable } from '@/components/drawing-table/drawing-table'
import { can } from '@/lib/access'
import { AppError } from '@/lib/errors'
import type { Context } from '@/lib/server/context'
import { requireContext } from '@/lib/server/people/require-context'
import { getSheet } from '@/lib/server/sheets/get-sheet'

export const metadata: Metadata = { title: 'Drawing table' }

interface Props {
  params: Promise<{ projectId: string; facadeId: string }>
}

/** The sheet of this facade, where it is theirs to see and stands under this project. */
function readSheet(context: Context, projectId: string, facadeId: string) {
  try {
    const found = getSheet(context, { facadeId })
    return found.facade.projectId === projectId ? found : null
  } catch (error) {
    if (error instanceof AppError && error.code === 'not-found') return null
    throw error
  }
}

export default async function DrawingTablePage({ params }: Props) {
  const { projectId, facadeId } = await params
  const context = await requireContext()
  const found = readSheet(context, projectId, facadeId)
  if (!found) notFound()
  const { facade, sheet, seq, report } = found
  const { role } = context.actor
  return (
    <main className="flex h-[calc(100dvh-var(--studio-header,4rem))] min-h-[36rem] flex-col">
      <DrawingTable facade={facade} sheet={sheet} seq={seq} report={report} canEdit={can(role, 'sheet:edit')} canListPlants={can(role, 'takeoff:read')} />
    </main>
  )
}
