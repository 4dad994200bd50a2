import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { MeasureScreen } from '@/components/site/measure-screen'
import { can } from '@/lib/access'
import { AppError } from '@/lib/errors'
import type { Context } from '@/lib/server/context'
import { requireContext } from '@/lib/server/people/require-context'
import { getSheet } from '@/lib/server/sheets/get-sheet'

export const metadata: Metadata = { title: 'Measure' }

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

export default async function MeasurePage({ params }: Props) {
  const { projectId, facadeId } = await params
  const context = await requireContext()
  const found = readSheet(context, projectId, facadeId)
  if (!found) notFound()
  const { facade, sheet, seq } = found
  return (
    <main className="px-4 pb-12">
      <h1 className="font-heading text-3xl">Measure: {facade.name}</h1>
      <MeasureScreen facade={facade} sheet={sheet} seq={seq} readOnly={!can(context.actor.role, 'sheet:edit')} />
    </main>
  )
}
