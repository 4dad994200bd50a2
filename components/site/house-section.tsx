'use client'
import { SIDINGS } from '@/lib/spacing'
import { withWidth } from '@/lib/sheet'
import { LengthField } from './length-field'
import { useMeasure, useThing } from './measure-context'
import { ChoiceField, NotKept, FieldGrid, Section } from './parts'
import { WallLine } from './wall-line'

const SIDING_WORDS = { lap: 'Lap siding', masonry: 'Masonry' } as const

/** Width, wall line, gutter, overhang and foundation of the house front. */
export function HouseSection() {
  const { units, readOnly } = useMeasure()
  const { value: facade, type, choose, leave, problemAt, elsewhere, putBack } = useThing('facade')
  const width = facade.wall.at(-1)!.x - facade.wall[0]!.x
  const shared = { units, readOnly, onLeave: leave }
  return (
    <Section id="house" title="House front" lead="Stand in front of the house: x runs to the right along the wall, out is towards you, heights are from zero.">
      <FieldGrid>
        <LengthField {...shared} label="Width" value={width} problem={problemAt('wall') ?? elsewhere[0] ?? null} onValue={(inches) => type(withWidth(facade, inches))} hint="corner to corner" />
        <LengthField {...shared} label="Gutter above zero" value={facade.gutter} problem={problemAt('gutter')} onValue={(gutter) => type({ gutter })} />
        <LengthField {...shared} label="Roof overhang" value={facade.overhang} problem={problemAt('overhang')} onValue={(overhang) => type({ overhang })} hint="how far the eaves reach out" />
        <LengthField {...shared} label="Foundation showing" value={facade.exposed} problem={problemAt('exposed')} onValue={(exposed) => type({ exposed })} hint="soil to siding" />
        <LengthField {...shared} label="Mulch depth" value={facade.mulch} problem={problemAt('mulch')} onValue={(mulch) => type({ mulch })} />
        <ChoiceField label="Siding" value={facade.siding} choices={SIDINGS} words={SIDING_WORDS} readOnly={readOnly} onChoice={(siding) => choose({ siding })} />
      </FieldGrid>
      <NotKept messages={elsewhere} onPutBack={putBack} />
      <WallLine />
    </Section>
  )
}
