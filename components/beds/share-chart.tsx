import { BOUNDS, type ShareByYear, type ShareOf } from '@/lib/spacing'

const YEARS = ['0', '1', '3', '5', '10', '20'] as const satisfies readonly (keyof ShareByYear)[]
const BOUND_WORDS = { low: 'Low', expected: 'Expected', high: 'High' } as const

const WIDE = 260
const TALL = 92
const LEFT = 34
const TOP = 8

const xOf = (year: string) => LEFT + (Number(year) / 20) * (WIDE - LEFT - 8)
const yOf = (share: number) => TOP + (1 - share) * (TALL - TOP - 18)
const percent = (share: number) => `${Math.round(share * 100)} %`
const line = (of: ShareByYear, years: readonly (typeof YEARS)[number][]) => years.map((year) => `${xOf(year)} ${yOf(of[year])}`).join('L')

interface Props {
  /** What is covered or hidden: "Front bed", "Kitchen". */
  title: string
  /** What the share is of: "under plants", "hidden". */
  what: string
  shares: ShareOf
}

/** A share over twenty years: the expected line in its band from low to high, and the same in figures for those who read them. */
export function ShareChart({ title, what, shares }: Props) {
  const band = `M${line(shares.high, [...YEARS])}L${line(shares.low, [...YEARS].reverse())}Z`
  return (
    <figure>
      <figcaption>
        <strong>{title}</strong>: {percent(shares.expected.mature)} {what} when grown <span className="text-ink-soft">({percent(shares.low.mature)} to {percent(shares.high.mature)})</span>
      </figcaption>
      <svg viewBox={`0 0 ${WIDE} ${TALL}`} aria-hidden="true" className="mt-1 w-full max-w-sm">
        {[0, 0.5, 1].map((share) => (
          <g key={share}>
            <path d={`M${LEFT} ${yOf(share)}H${WIDE - 8}`} stroke="var(--color-rule)" />
            <text x={LEFT - 5} y={yOf(share) + 4} textAnchor="end" fontSize="12" fill="var(--color-ink-soft)" fontFamily="var(--font-mono)">{Math.round(share * 100)}</text>
          </g>
        ))}
        <path d={band} fill="var(--color-leaf)" opacity="0.2" />
        <path d={`M${line(shares.expected, [...YEARS])}`} fill="none" stroke="var(--color-leaf)" strokeWidth="2" />
        {['0', '5', '10', '20'].map((year) => <text key={year} x={xOf(year)} y={TALL - 4} textAnchor="middle" fontSize="12" fill="var(--color-ink-soft)" fontFamily="var(--font-mono)">{year}</text>)}
      </svg>
      <table className="sr-only">
        <caption>{title}, share {what}, by year after planting</caption>
        <thead><tr><th scope="col">Size</th>{YEARS.map((year) => <th key={year} scope="col">Year {year}</th>)}<th scope="col">Grown</th></tr></thead>
        <tbody>
          {BOUNDS.map((bound) => (
            <tr key={bound}><th scope="row">{BOUND_WORDS[bound]}</th>{[...YEARS, 'mature' as const].map((year) => <td key={year}>{percent(shares[bound][year])}</td>)}</tr>
          ))}
        </tbody>
      </table>
    </figure>
  )
}
