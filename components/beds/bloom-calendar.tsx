import { WideTable } from '@/components/ui'
import { fruitInk, lookOf } from '@/lib/drawing'
import { monthName, type Plant } from '@/lib/plants'

const MONTHS = Array.from({ length: 12 }, (_, i) => i + 1)

export interface Fruit {
  color: string
  months: readonly number[]
}

function Cell({ plant, fruit, month }: { plant: Plant; fruit: Fruit | undefined; month: number }) {
  const [bloom] = lookOf(plant, month).bloom
  const hasFruit = fruit?.months.includes(month) ?? false
  const words = [bloom && `in flower, ${plant.bloomColor}`, hasFruit && `in fruit, ${fruit?.color || 'color not listed'}`].filter(Boolean).join('; ')
  return (
    <td className="h-7 border border-rule p-0 text-center" title={words || undefined}>
      <svg viewBox="0 0 20 20" aria-hidden="true" className="mx-auto size-5">
        {bloom && <circle cx="10" cy={hasFruit ? 6 : 10} r={hasFruit ? 4 : 6.5} fill={`var(--color-${bloom})`} stroke="var(--color-ink)" strokeWidth="1.2" />}
        {hasFruit && <rect x="5.5" y={bloom ? 11 : 5.5} width="9" height={bloom ? 7 : 9} fill={`var(--color-${fruitInk(fruit?.color ?? '')})`} stroke="var(--color-ink)" strokeWidth="1.2" />}
      </svg>
      {words && <span className="sr-only">{words}</span>}
    </td>
  )
}

interface Props {
  title: string
  plants: readonly Plant[]
  /** The drawing's letter of a plant. */
  keyOf: (plant: Plant) => string
  /** By plant id; a plant of which nothing is known is left blank. */
  fruits: Readonly<Record<string, Fruit>>
}

/** What flowers (round) and fruits (square) in which month: a line for each plant of a bed. */
export function BloomCalendar({ title, plants, keyOf, fruits }: Props) {
  return (
    <WideTable label={`Flower and fruit of ${title} by month`}>
      <table className="w-full min-w-72 table-fixed border-collapse">
        <caption className="pb-1 text-left">Flower <span aria-hidden="true">●</span> and fruit <span aria-hidden="true">■</span> by month</caption>
        <thead>
          <tr>
            <th scope="col" className="w-9 text-left text-sm font-normal"><span className="sr-only">Plant</span></th>
            {MONTHS.map((month) => <th key={month} scope="col" abbr={monthName(month)} className="text-sm font-normal text-ink-soft"><span aria-hidden="true">{monthName(month)[0]}</span><span className="sr-only">{monthName(month)}</span></th>)}
          </tr>
        </thead>
        <tbody>
          {plants.map((plant) => (
            <tr key={plant.id}>
              <th scope="row" className="text-left" title={plant.botanical}><span aria-hidden="true">{keyOf(plant)}</span><span className="sr-only">{plant.botanical}</span></th>
              {MONTHS.map((month) => <Cell key={month} plant={plant} fruit={fruits[plant.id]} month={month} />)}
            </tr>
          ))}
        </tbody>
      </table>
    </WideTable>
  )
}
