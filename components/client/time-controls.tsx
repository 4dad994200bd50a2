'use client'

import { useId, useSyncExternalStore } from 'react'
import { LAST_YEAR, LINKED_YEARS, SEASONS, SEASON_WORDS, TENTH, hrefOf, seasonWords, yearWords, type Season, type Shown } from './view-state'

interface Props {
  shown: Shown
  onChange: (shown: Shown) => void
}

const nothing = () => () => undefined

/** False while the page is plain HTML, true once it runs: the slider needs it, the links do not. */
function useRunning(): boolean {
  return useSyncExternalStore(nothing, () => true, () => false)
}

/** Year and season. Plain links until the page runs, then a slider with buttons. */
export function TimeControls({ shown, onChange }: Props) {
  const running = useRunning()
  return (
    <section aria-label="Year and season" className="sticky bottom-0 z-10 border-t-2 border-rule bg-paper px-4 pt-2 pb-3">
      {running ? <YearSlider shown={shown} onChange={onChange} /> : <YearLinks shown={shown} />}
      <SeasonChoice shown={shown} onChange={running ? (season) => onChange({ ...shown, season }) : null} />
    </section>
  )
}

function YearTitle({ shown }: { shown: Shown }) {
  return <><span className="font-heading text-xl">{yearWords(shown.year)}</span> <span className="text-ink-soft">{seasonWords(shown)}</span></>
}

function YearLinks({ shown }: { shown: Shown }) {
  return (
    <nav aria-label="Year" className="min-h-24">
      <p><YearTitle shown={shown} /></p>
      <ul className="flex justify-between">
        {LINKED_YEARS.map((year) => (
          <li key={year}>
            <a
              href={hrefOf({ ...shown, year })}
              aria-current={year === shown.year ? 'true' : undefined}
              className="inline-flex min-h-14 min-w-11 items-center justify-center px-2 underline decoration-rule decoration-2 underline-offset-4 aria-[current]:font-bold aria-[current]:decoration-leaf"
            >
              {year === 0 ? 'Planted' : `Year ${year}`}
            </a>
          </li>
        ))}
      </ul>
    </nav>
  )
}

const STEP = 'inline-flex size-11 shrink-0 items-center justify-center rounded border border-ink-soft bg-sheet text-2xl leading-none disabled:opacity-40'

function YearSlider({ shown, onChange }: Props) {
  const id = useId()
  const go = (year: number) => onChange({ ...shown, year: Math.min(LAST_YEAR, Math.max(0, year)) })
  return (
    <div className="min-h-24">
      <label htmlFor={id}><YearTitle shown={shown} /></label>
      <div className="flex items-center gap-3">
        <button type="button" className={STEP} aria-label="One year earlier" disabled={shown.year === 0} onClick={() => go(shown.year - 1)}>−</button>
        <div className="min-w-0 grow">
          <input
            id={id} type="range" min={0} max={LAST_YEAR} step={1} value={shown.year}
            aria-valuetext={`${yearWords(shown.year)}, ${seasonWords(shown)}`}
            className="block h-11 w-full accent-leaf"
            onChange={(event) => go(event.target.valueAsNumber)}
          />
          <Ruler />
        </div>
        <button type="button" className={STEP} aria-label="One year later" disabled={shown.year === LAST_YEAR} onClick={() => go(shown.year + 1)}>+</button>
      </div>
    </div>
  )
}

/** Ticks under the slider: every year short, every fifth long, the tenth summer strongest. */
function Ruler() {
  const years = Array.from({ length: LAST_YEAR + 1 }, (_, year) => year)
  return (
    <div aria-hidden="true" className="-mt-2 px-2">
      <svg viewBox="0 0 200 8" preserveAspectRatio="none" width="100%" height="8" className="block overflow-visible">
        {years.map((year) => (
          <path
            key={year}
            d={`M${year * 10} 0V${year % 5 ? 4 : 8}`}
            stroke={`var(--color-${year === TENTH ? 'leaf' : 'ink-soft'})`}
            strokeWidth={year === TENTH ? 3 : 1}
            vectorEffect="non-scaling-stroke"
          />
        ))}
      </svg>
      <div className="flex justify-between font-mono text-sm text-ink-soft">
        <span>planted</span><span className="font-bold text-leaf">10th summer</span><span>20</span>
      </div>
    </div>
  )
}

function SeasonChoice({ shown, onChange }: { shown: Shown; onChange: ((season: Season) => void) | null }) {
  return (
    <nav aria-label="Season" className="mt-2 grid grid-cols-4 border border-ink-soft bg-sheet">
      {SEASONS.map((season) => (
        <a
          key={season}
          href={hrefOf({ ...shown, season })}
          aria-current={season === shown.season ? 'true' : undefined}
          className="inline-flex min-h-11 items-center justify-center border-r border-rule last:border-r-0 aria-[current]:bg-ink aria-[current]:text-sheet"
          onClick={(event) => {
            if (!onChange) return
            event.preventDefault()
            onChange(season)
          }}
        >
          {SEASON_WORDS[season]}
        </a>
      ))}
    </nav>
  )
}
