import { PlantPicture } from '@/components/drawing/plant-picture'
import type { PlantFacts } from './plant-facts'
import type { ClientSheet } from './types'

interface Props {
  facts: PlantFacts
  sheet: ClientSheet
  year: number
  month: number
  name: string
}

/** One plant of the drawing: its key, names, picture at the year shown, sizes and flower. */
export function PlantCard({ facts, sheet, year, month, name }: Props) {
  const { key, plant, placement, count, sizes, flower, remark } = facts
  return (
    <li className="flex gap-4 border-t border-rule px-4 py-4">
      <div className="w-24 shrink-0 self-start border border-rule bg-sheet">
        <PlantPicture plant={plant} placement={placement} facade={sheet.facade} zone={sheet.site.zone} year={year} month={month} name={name} />
      </div>
      <div className="min-w-0 grow">
        <h3 className="flex items-start gap-2 text-lg leading-snug font-bold">
          <span className="mt-px inline-flex h-7 min-w-7 shrink-0 items-center justify-center rounded-full border-[1.5px] border-ink bg-sheet px-1 text-sm" aria-label={`Key ${key}`}>{key}</span>
          <span className="min-w-0 break-words">{facts.name}{count > 1 && <span className="font-normal text-ink-soft"> × {count}</span>}</span>
        </h3>
        <p className="mt-0.5 font-heading text-lg leading-snug italic">{plant.botanical}</p>
        <p className="mt-1">{sizes} {flower} {remark}</p>
      </div>
    </li>
  )
}
