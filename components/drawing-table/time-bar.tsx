'use client'
/** The year, the bound and the season the drawing shows. */
import { useId } from 'react'
import { BOUNDS, type Bound } from '@/lib/spacing'
import { LAST_YEAR, TENTH_SUMMER } from './editor'
import { useDesk, useEditorState } from './desk-context'
import { Segments } from './parts'

const BOUND_CHOICES = BOUNDS.map((bound) => [bound, { low: 'Low', expected: 'Expected', high: 'High' }[bound]] as const)
/** A month that stands for each season. */
const SEASON_CHOICES = [['5', 'Spring'], ['7', 'Summer'], ['10', 'Fall'], ['1', 'Winter']] as const
const TICKS = [0, 5, TENTH_SUMMER, 15, LAST_YEAR]

const yearWords = (year: number) => (year === 0 ? 'Planted' : `Year ${year}`)
const yearNote = (year: number) => (year === TENTH_SUMMER ? 'tenth summer' : year === 0 ? 'the day itself' : 'since planting')

function YearControl() {
  const { editor } = useDesk()
  const { year } = useEditorState()
  const id = useId()
  return (
    <div className="flex min-w-64 flex-1 items-center gap-4">
      <label htmlFor={id} className="w-28 shrink-0">
        <span className="block font-heading text-xl leading-tight">{yearWords(year)}</span>
        <span className="block text-sm text-ink-soft">{yearNote(year)}</span>
      </label>
      <div className="relative min-w-0 flex-1">
        <input
          id={id}
          type="range"
          min={0}
          max={LAST_YEAR}
          step={1}
          value={year}
          list={`${id}-ticks`}
          aria-valuetext={`${yearWords(year)}, ${yearNote(year)}`}
          onChange={(event) => editor.setYear(Number(event.target.value))}
          className="block h-11 w-full cursor-pointer accent-leaf"
        />
        <datalist id={`${id}-ticks`}>{TICKS.map((tick) => <option key={tick} value={tick} />)}</datalist>
        <svg aria-hidden="true" className="pointer-events-none -mt-2 h-5 w-full overflow-visible font-mono text-[13px]">
          {/* The thumb's middle runs from 8 px inside the left end to 8 px inside the right one. */}
          {TICKS.map((tick) => (
            <text
              key={tick}
              x={`${(tick / LAST_YEAR) * 100}%`}
              dx={8 - (tick / LAST_YEAR) * 16}
              y="13"
              textAnchor={tick === 0 ? 'start' : tick === LAST_YEAR ? 'end' : 'middle'}
              className={tick === TENTH_SUMMER ? 'fill-leaf font-bold' : 'fill-ink-soft'}
            >
              {tick === 0 ? 'planted' : tick === TENTH_SUMMER ? '10th summer' : tick}
            </text>
          ))}
        </svg>
      </div>
    </div>
  )
}

export function TimeBar() {
  const { editor } = useDesk()
  const { bound, month } = useEditorState()
  return (
    <div className="flex flex-wrap items-center gap-x-6 gap-y-2 border-t border-rule px-4 py-2">
      <YearControl />
      <Segments<Bound> label="Size on record" value={bound} choices={BOUND_CHOICES} onChoice={editor.setBound} />
      <Segments label="Season" value={String(month) as (typeof SEASON_CHOICES)[number][0]} choices={SEASON_CHOICES} onChoice={(value) => editor.setMonth(Number(value))} />
    </div>
  )
}
