import { monthName, wordOf, type LibraryPlant } from '@/lib/plants'

const MONTHS = Array.from({ length: 12 }, (_, i) => i + 1)
/** Months in which leaves turn, at these latitudes. */
const FALL_MONTHS = [10, 11]

/** Tokens of flower, fruit and fall colours; others are drawn in ink. */
const BLOOM_INKS = new Set(['white', 'pink', 'red', 'orange', 'yellow', 'green', 'blue', 'purple'])

interface Band {
  title: string
  what: string
  months: readonly number[]
  ink: string
}

function bandsOf({ bloomMonths, bloomColor, fruitMonths, fruitColor, fallColor }: LibraryPlant): Band[] {
  const flower: Band = { title: 'Flower', what: bloomColor === 'multi' ? 'several colors' : wordOf(bloomColor || 'in flower').toLowerCase(), months: bloomMonths, ink: BLOOM_INKS.has(bloomColor) ? `bloom-${bloomColor}` : 'bloom-pink' }
  const fruit: Band = { title: 'Fruit', what: fruitColor || 'fruit', months: fruitMonths, ink: 'ink-soft' }
  const fall: Band = { title: 'Fall leaf', what: fallColor === 'multi' ? 'several colors' : fallColor, months: fallColor === 'none' ? [] : FALL_MONTHS, ink: 'risk' }
  return [flower, fruit, fall]
}

/** The year in twelve cells: when it flowers, fruits and turns. Every filled cell says so in words too. */
export function MonthsStrip({ plant }: { plant: LibraryPlant }) {
  return (
    <div className="overflow-x-auto">
      <table className="w-full min-w-136 table-fixed border-collapse text-center">
        <caption className="sr-only">Months of flower, fruit and fall color</caption>
        <thead>
          <tr>
            <th scope="col" className="w-24 text-left text-sm font-normal text-ink-soft">Month</th>
            {MONTHS.map((month) => <th key={month} scope="col" className="text-sm font-normal text-ink-soft">{monthName(month)}</th>)}
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
    </div>
  )
}
