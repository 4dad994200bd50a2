import type { Metadata } from 'next'
import { BotanicalName } from '@/components/plants/botanical-name'
import { Cautions } from '@/components/plants/cautions'
import { FactList, SourceList } from '@/components/plants/fact-list'
import { MonthsStrip } from '@/components/plants/months-strip'
import { CARD, HEADING } from '@/components/plants/parts'
import { RemovePlant } from '@/components/plants/remove-plant'
import { SizeFigure } from '@/components/plants/size-figure'
import { LinkButton, PageHeader } from '@/components/ui'
import { can } from '@/lib/access'
import { requireContext } from '@/lib/server/people/require-context'
import { removePlantAction } from '../actions'
import { readPlant } from '../read-plant'

interface Props {
  params: Promise<{ plantId: string }>
}

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { plantId } = await params
  return { title: readPlant(await requireContext(), plantId).botanical }
}

export default async function PlantPage({ params }: Props) {
  const { plantId } = await params
  const context = await requireContext()
  const plant = readPlant(context, plantId)
  const canEdit = plant.studioId !== null && can(context.actor.role, 'plant:edit')
  return (
    <main className="mx-auto grid max-w-7xl grid-cols-1 gap-4 px-4 py-6">
      <PageHeader
        title={<BotanicalName name={plant.botanical} />} crumbs={[{ href: '/plants', label: 'Plants' }]}
        actions={canEdit && <><LinkButton href={`/plants/${plantId}/edit`}>Change plant</LinkButton><RemovePlant remove={removePlantAction.bind(null, plantId)} /></>}
      >
        {[plant.common, plant.studioId === null ? 'shared library' : 'your studio’s own'].filter(Boolean).join(' · ')}
      </PageHeader>
      <div className="grid grid-cols-1 gap-4 lg:grid-cols-[minmax(0,3fr)_minmax(0,2fr)]">
        <section className={CARD} aria-label="Full-grown size">
          <h2 className={HEADING}>Full grown</h2>
          <SizeFigure plant={plant} />
        </section>
        <div className="grid grid-cols-1 content-start gap-4">
          <Cautions plant={plant} />
          <section className={CARD} aria-label="Through the months">
            <h2 className={`${HEADING} mb-2`}>Through the months</h2>
            <MonthsStrip plant={plant} />
          </section>
        </div>
      </div>
      <FactList plant={plant} />
      <SourceList plant={plant} />
    </main>
  )
}
