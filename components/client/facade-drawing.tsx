'use client'

import { useMemo, useRef, useSyncExternalStore, type RefObject } from 'react'
import { SceneSvg } from '@/components/drawing/scene-svg'
import { buildScene, type Box, type Scene } from '@/lib/drawing'
import { SEASON_MONTHS, hrefOf, seasonWords, yearWords, type Shown } from './view-state'
import type { ClientFacade } from './types'

/** A phone's width less its margins: what the drawing is laid out for until the true width is known. */
const PHONE_PX = 366
/** A part shows about 16 ft of wall. */
const PART_IN = 192
const MOST_PARTS = 6
/** Widest drawing whose words are set for its true width. */
const WIDEST_PX = 1100

function useWidth(ref: RefObject<HTMLElement | null>): number {
  return useSyncExternalStore(
    (changed) => {
      const watch = new ResizeObserver(changed)
      if (ref.current) watch.observe(ref.current)
      return () => watch.disconnect()
    },
    () => Math.min(ref.current?.clientWidth || PHONE_PX, WIDEST_PX),
    () => PHONE_PX,
  )
}

/** How many parts a front is enlarged by. */
export function partsOf(scene: Pick<Scene, 'elevation'>): number {
  return Math.min(MOST_PARTS, Math.max(1, Math.round(scene.elevation.box.width / PART_IN)))
}

/** The window of one part; parts overlap a little so that no plant is cut in all of them. */
function partBox({ x, y, width, height }: Box, part: number, parts: number): Box {
  const wide = (width / parts) * (parts > 1 ? 1.12 : 1)
  const left = parts === 1 ? x : x + ((width - wide) * part) / (parts - 1)
  return { x: left, y, width: wide, height }
}

interface Props {
  facade: ClientFacade
  index: number
  shown: Shown
  onPart: (part: string | null) => void
}

/** One house front with its plants, whole or one part enlarged. */
export function FacadeDrawing({ facade, index, shown, onPart }: Props) {
  const holder = useRef<HTMLDivElement>(null)
  const width = useWidth(holder)
  const month = SEASON_MONTHS[shown.season]
  const [facadeAt, partAt] = (shown.part ?? '').split('.').map(Number)
  const { scene, box, parts, part } = useMemo(() => {
    const options = { sheet: facade.sheet, year: shown.year, bound: 'expected' as const, month, show: { goes: false, notes: false } }
    const probe = buildScene({ ...options, show: { ...options.show, keys: false, limits: false } })
    const count = partsOf(probe)
    const chosen = facadeAt === index && partAt !== undefined && partAt < count ? partAt : null
    const wide = chosen === null ? probe.elevation.box.width : partBox(probe.elevation.box, chosen, count).width
    const drawn = buildScene({ ...options, pxPerInch: width / wide })
    const whole = drawn.elevation.box
    return { scene: drawn, box: chosen === null ? whole : partBox(whole, chosen, count), parts: count, part: chosen }
  }, [facade.sheet, shown.year, month, width, facadeAt, partAt, index])
  const when = `${yearWords(shown.year)}, ${seasonWords(shown)}`
  return (
    <div ref={holder}>
      <SceneSvg
        scene={scene}
        view="elevation"
        window={box}
        name={`front-${index}`}
        label={`${facade.name}: the house front with its plants. ${when}.`}
        description="Letters on the plants are the letters of the list below. Dashed lines mark the window sills and the gutter."
        className="block"
      />
      {parts > 1 && <Parts parts={parts} part={part} index={index} shown={shown} name={facade.name} onPart={onPart} />}
    </div>
  )
}

interface PartsProps {
  parts: number
  part: number | null
  index: number
  shown: Shown
  name: string
  onPart: (part: string | null) => void
}

function partName(part: number, parts: number): string {
  if (parts === 2) return part === 0 ? 'Left' : 'Right'
  if (parts === 3) return ['Left', 'Middle', 'Right'][part]!
  return `Part ${part + 1}`
}

function Parts({ parts, part, index, shown, name, onPart }: PartsProps) {
  const choices: (number | null)[] = [null, ...Array.from({ length: parts }, (_, i) => i)]
  return (
    <nav aria-label={`Enlarge a part of ${name}`} className="mt-1 flex flex-wrap gap-x-1">
      {choices.map((choice) => {
        const to = choice === null ? null : `${index}.${choice}`
        return (
          <a
            key={to ?? 'whole'}
            href={hrefOf({ ...shown, part: to })}
            aria-current={choice === part ? 'true' : undefined}
            className="inline-flex min-h-11 items-center px-2.5 text-ink underline decoration-rule decoration-2 underline-offset-4 aria-[current]:font-bold aria-[current]:decoration-leaf"
            onClick={(event) => {
              event.preventDefault()
              onPart(to)
            }}
          >
            {choice === null ? 'Whole front' : partName(choice, parts)}
          </a>
        )
      })}
    </nav>
  )
}
