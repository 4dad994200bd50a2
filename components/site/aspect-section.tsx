'use client'
import { useMemo } from 'react'
import { suggestLight } from '@/lib/light'
import { LIGHTS, type Light } from '@/lib/plants'
import { useMeasure, useThing } from './measure-context'
import { ActionButton, ChoiceField, FieldGrid, Section } from './parts'
import { TypedField, type Read } from './typed-field'

const LIGHT_WORDS = { 'full-sun': 'Full sun: 6 hours or more', 'part-shade': 'Part shade: 4 to 6 hours', 'full-shade': 'Shade: under 4 hours' } as const
const WINDS = ['north', 'northeast', 'east', 'southeast', 'south', 'southwest', 'west', 'northwest'] as const
const POINTS: Record<string, number> = { n: 0, ne: 45, e: 90, se: 135, s: 180, sw: 225, w: 270, nw: 315 }

/** Degrees clockwise from north, or a compass point by name or letters. Empty: not taken. */
function readFacing(text: string): Read<number | undefined> {
  const plain = text.trim().toLowerCase().replace(/[\s-]+/g, '').replace(/(°|degrees?|deg)$/, '')
  if (plain === '') return { ok: true, value: undefined }
  const wind = WINDS.findIndex((name) => name === plain)
  if (wind >= 0) return { ok: true, value: wind * 45 }
  if (Object.hasOwn(POINTS, plain)) return { ok: true, value: POINTS[plain]! }
  if (!/^\d{1,3}([.,]\d+)?$/.test(plain)) return { ok: false, message: 'Give degrees from north, 0 to 360, or a compass point such as SW.' }
  return { ok: true, value: Number(plain.replace(',', '.')) }
}

const windOf = (degrees: number) => WINDS[Math.round(degrees / 45) % 8]!

const SHORT_WORDS: Record<Light, string> = { 'full-sun': 'full sun', 'part-shade': 'part shade', 'full-shade': 'shade' }

/** What the compass and the latitude say of the light: a suggestion, for trees and neighbours are not on the sheet. */
function SuggestedLight({ facing, latitude, light, onTake }: { facing: number | undefined; latitude: number | undefined; light: Light; onTake: ((light: Light) => void) | null }) {
  const suggested = useMemo(() => (facing === undefined || latitude === undefined ? null : suggestLight({ facing, latitude })), [facing, latitude])
  if (!suggested) return <p className="mt-2 text-sm text-ink-soft">With the facing here and the latitude on the project&apos;s page, the hours of sun are worked out.</p>
  const differs = suggested.light !== light
  return (
    <div className="mt-2 flex flex-wrap items-center gap-3">
      <p className="text-sm text-ink-soft">On an open site about {suggested.hours.toFixed(1)} hours of direct sun a day, April to September: {SHORT_WORDS[suggested.light]}. Trees, neighbors and eaves take their share.</p>
      {differs && onTake ? <ActionButton kind="plain" onPress={() => onTake(suggested.light)}>Set {SHORT_WORDS[suggested.light]}</ActionButton> : null}
    </div>
  )
}

/** Where the wall looks, and how much sun that leaves it. */
export function AspectSection() {
  const { readOnly, state } = useMeasure()
  const { value: aspect, type, choose, leave, problemAt } = useThing('aspect')
  return (
    <Section id="light" title="Facing and light" lead="Stand with your back to the wall: the compass tells where it looks.">
      <FieldGrid columns={2}>
        <TypedField<number | undefined>
          label="Looks towards"
          readOnly={readOnly}
          value={aspect.facing}
          read={readFacing}
          write={(degrees) => (degrees === undefined ? '' : `${degrees}°`)}
          echo={(degrees) => (degrees === undefined ? 'Not taken yet' : windOf(degrees))}
          hint="degrees, or N, NE, E"
          problem={problemAt('facing')}
          onValue={(facing) => type({ facing })}
          onLeave={leave}
        />
        <ChoiceField label="Direct sun in summer" value={aspect.light} choices={LIGHTS} words={LIGHT_WORDS} readOnly={readOnly} onChoice={(light) => choose({ light })} />
      </FieldGrid>
      <SuggestedLight facing={aspect.facing} latitude={state.sheet.site.latitude} light={aspect.light} onTake={readOnly ? null : (light) => choose({ light })} />
    </Section>
  )
}
