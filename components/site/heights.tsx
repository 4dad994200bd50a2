'use client'
import { roundLength, formatLength } from '@/lib/measure'
import { LengthField } from './length-field'
import { useMeasure, type HeightsFrom } from './measure-context'
import { Choice } from './parts'

const WORDS = { soil: 'above the soil here', zero: 'above zero' } as const

/** Where the heights of openings and fixtures are taken from; they are kept above zero either way. */
export function HeightsChoice() {
  const { heightsFrom, setHeightsFrom } = useMeasure()
  return <Choice<HeightsFrom> label="Heights are measured" value={heightsFrom} choices={['soil', 'zero']} words={WORDS} onChoice={setHeightsFrom} />
}

interface Props {
  label: string
  longLabel: string
  /** Height on the z axis. */
  value: number
  /** Height of the soil below it on the z axis. */
  soil: number
  problem: string | null
  onValue: (z: number) => void
  onLeave: () => void
}

/** A height, entered above the soil below it or above zero; the other one is said under the field. */
export function HeightField({ value, soil, onValue, ...props }: Props) {
  const { units, readOnly, heightsFrom } = useMeasure()
  const zero = heightsFrom === 'soil' ? soil : 0
  const also = (height: number) =>
    heightsFrom === 'soil' ? `${formatLength(roundLength(height + soil), units)} above zero` : `${formatLength(roundLength(height - soil), units)} above the soil`
  return (
    <LengthField {...props} key={heightsFrom} units={units} readOnly={readOnly} value={value - zero} also={also} onValue={(height) => onValue(roundLength(height + zero))} />
  )
}
