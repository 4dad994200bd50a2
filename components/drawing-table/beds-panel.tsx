'use client'
/** Each bed and window over the years: cover, empty pockets, flower and fruit, foliage. */
import { useEffect, useMemo } from 'react'
import { BloomCalendar } from '@/components/beds/bloom-calendar'
import { FoliageStrip } from '@/components/beds/foliage-strip'
import { ShareChart } from '@/components/beds/share-chart'
import { formatLength } from '@/lib/measure'
import { plantKeys } from '@/lib/sheet'
import { ANNUAL_SPACING_IN, check, pointInPolygon, type Bed, type Pocket, type Report, type Sheet } from '@/lib/spacing'
import { useDesk, useEditorState } from './desk-context'
import { useLibrary } from './library'

function standingIn(bed: Bed, { placements, plants }: Sheet) {
  const byId = new Map(plants.map((plant) => [plant.id, plant]))
  return placements.flatMap((placement) => {
    const plant = byId.get(placement.plant)
    return plant && placement.status !== 'goes' && pointInPolygon(placement, bed.outline) ? [{ placement, plant }] : []
  })
}

function Pockets({ pockets }: { pockets: readonly Pocket[] }) {
  if (pockets.length === 0) return <p>No empty pocket 18 in across is left when all is grown.</p>
  const annuals = pockets.reduce((sum, pocket) => sum + pocket.annuals, 0)
  return (
    <p>
      {pockets.length === 1 ? 'One empty pocket is' : `${pockets.length} empty pockets are`} left when all is grown, up to {formatLength(Math.round(pockets[0]!.diameter))} across: room for {annuals} annuals, {ANNUAL_SPACING_IN} in apart. They are drawn on the plan.
    </p>
  )
}

function OneBed({ bed, sheet, report }: { bed: Bed; sheet: Sheet; report: Report }) {
  const { month } = useEditorState()
  const library = useLibrary()
  const standing = useMemo(() => standingIn(bed, sheet), [bed, sheet])
  const keys = plantKeys(sheet)
  const plants = [...new Map(standing.map(({ plant }) => [plant.id, plant])).values()].sort((a, b) => (keys.get(a.id) ?? '').localeCompare(keys.get(b.id) ?? ''))
  const cover = report.cover.find(({ id }) => id === bed.id)
  return (
    <section aria-label={bed.name} className="grid gap-3 border-b border-rule p-4">
      <h2 className="font-heading text-xl">{bed.name}</h2>
      {cover && <ShareChart title="Cover" what="of the soil under plants" shares={cover} />}
      <Pockets pockets={report.pockets.filter((pocket) => pocket.bed === bed.id)} />
      {plants.length > 0 && <FoliageStrip bed={bed} standing={standing} month={month} />}
      {plants.length > 0 && <BloomCalendar title={bed.name} plants={plants} keyOf={(plant) => keys.get(plant.id) ?? ''} fruits={library.data?.fruits ?? {}} />}
    </section>
  )
}

export function BedsPanel() {
  const { editor } = useDesk()
  const { sheet } = useEditorState()
  const report = useMemo(() => check(sheet), [sheet])
  const { pockets } = report
  useEffect(() => {
    editor.showPockets(pockets)
    return () => editor.showPockets([])
  }, [editor, pockets])
  const windows = report.windows.flatMap((shares) => {
    const opening = sheet.openings.find(({ id }) => id === shares.id)
    return opening ? [{ opening, shares }] : []
  })
  if (sheet.beds.length === 0 && windows.length === 0) return <p className="p-4">Beds and windows of this front are told of here once they are measured.</p>
  return (
    <>
      {sheet.beds.map((bed) => <OneBed key={bed.id} bed={bed} sheet={sheet} report={report} />)}
      {windows.length > 0 && (
        <section aria-label="Windows" className="grid gap-3 p-4">
          <h2 className="font-heading text-xl">Windows</h2>
          {windows.map(({ opening, shares }) => <ShareChart key={opening.id} title={opening.name} what="of the glass hidden" shares={shares} />)}
        </section>
      )}
    </>
  )
}
