import { WideTable } from '@/components/ui'
import { monthName, type LibraryPlant } from '@/lib/plants'

const MONTHS = Array.from({ length: 12 }, (_, i) => i + 1)
/** Leaves are drawn turning in these months; the weeks differ by place and year. */
const FALL_MONTHS = [10, 11]

/** Inks for colours as they are named in the library; others are drawn in soft ink. */
const FLOWER_AND_FRUIT: Record<string, string> = {
  white: 'bloom-white', pink: 'bloom-pink', red: 'bloom-red', orange: 'bloom-orange', yellow: 'bloom-yellow', green: 'bloom-green',
  blue: 'bloom-blue', purple: 'bloom-purple', multi: 'bloom-pink', black: 'ink', brown: 'bark',
}
const FALL: Record<string, string> = {
  yellow: 'foliage-gold', orange: 'foliage-fall', red: 'foliage-red', purple: 'foliage-purple', bronze: 'foliage-bronze', multi: 'foliage-fall',
}
const OTHER = 'ink-soft'

interface Band {
  title: string
  what: string
  months: readonly number[]
  ink: string
}

function bandsOf({ bloomMonths, bloomColor, fruitMonths, fruitColor, fallColor }: LibraryPlant): Band[] {
  const several = (color: string) => (color === 'multi' ? 'several colors' : color)
  return [
    { title: 'Flower', what: several(bloomColor) || 'in flower', months: bloomMonths, ink: FLOWER_AND_FRUIT[bloomColor] ?? OTHER },
    { title: 'Fruit', what: fruitColor || 'in fruit', months: fruitMonths, ink: FLOWER_AND_FRUIT[fruitColor] ?? OTHER },
    { title: 'Fall leaf', what: several(fallColor), months: fallColor === 'none' ? [] : FALL_MONTHS, ink: FALL[fallColor] ?? OTHER },
  ]
}

/** The year in twelve cells: when it flowers, fruits and turns. Every filled cell says so in words too. */
export function MonthsStrip({ plant }: { plant: LibraryPlant }) {
  return (
    <WideTable label="Months of flower, fruit and fall color">
      <table className="w-full min-w-88 table-fixed border-collapse text-center">
        <caption className="sr-only">Months of flower, fruit and fall color</caption>
        <thead>
          <tr>
            <th scope="col" className="w-20 text-left text-sm font-normal text-ink-soft">Month</th>
            {MONTHS.map((month) => <th key={month} scope="col" abbr={monthName(month)} className="text-sm font-normal text-ink-soft"><span aria-hidden="true">{monthName(month)[0]}</span><span className="sr-only">{monthName(month)}</span></th>)}
          </tr>
        </thead>
        <tbody>
          {bandsOf(plant).map(({ title, what, months, ink }) => (
            <tr key={title}>
              <th scope="row" className="text-left font-normal">{title}</th>
              {MONTHS.map((month) => (
                <td key={month} className="h-8 border border-rule p-0">
                  {months.includes(month) && (
                    <span className="flex h-full items-center justify-center" title={`${title}, ${monthName(month)}: ${what}`}>
                      <svg viewBox="0 0 20 20" className="h-6 w-6" aria-hidden="true"><circle cx="10" cy="10" r="7" fill={`var(--color-${ink})`} stroke="var(--color-ink)" strokeWidth="1.2" /></svg>
                      <span className="sr-only">{what}</span>
                    </span>
                  )}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
      {plant.fallColor !== 'none' && <p className="mt-2 text-sm text-ink-soft">Fall color is drawn in October and November; the weeks differ by place and year.</p>}
    </WideTable>
  )
}
