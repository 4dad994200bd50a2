'use client'
/** A length, typed in any form people use on site, echoed in feet and inches and in centimetres. */
import { formatLength, parseLength } from '@/lib/measure'
import { TypedField, type Read, type TypedFieldProps } from './typed-field'

export type Units = 'imperial' | 'metric'

type Shared = Omit<TypedFieldProps<number>, 'value' | 'read' | 'write' | 'echo' | 'inputMode' | 'onValue'> & {
  /** How lengths are shown; a bare number is inches or centimetres accordingly. */
  units: Units
  /** Said after the two ways of writing it, such as the height from another level. */
  also?: (inches: number) => string
}

interface Props extends Shared {
  /** Inches. */
  value: number
  onValue: (inches: number) => void
}

const bareUnit = (units: Units) => (units === 'metric' ? 'cm' : 'in')

function readLength(text: string, units: Units): Read<number> {
  const parsed = parseLength(text, bareUnit(units))
  return parsed.ok ? { ok: true, value: parsed.inches } : parsed
}

const echoOf = (inches: number, { units, also }: Pick<Shared, 'units' | 'also'>) => {
  const other = formatLength(inches, units === 'metric' ? 'imperial' : 'metric')
  return [`${formatLength(inches, units)} = ${other}`, also?.(inches)].filter(Boolean).join(' · ')
}

/** A length that must be there. */
export function LengthField({ units, also, ...props }: Props) {
  return (
    <TypedField<number>
      {...props}
      read={(text) => readLength(text, units)}
      write={(inches) => formatLength(inches, units)}
      echo={(inches) => echoOf(inches, { units, ...(also && { also }) })}
    />
  )
}

interface OptionalProps extends Shared {
  value: number | undefined
  onValue: (inches: number | undefined) => void
}

/** A length that may be left empty. */
export function OptionalLengthField({ units, also, ...props }: OptionalProps) {
  return (
    <TypedField<number | undefined>
      {...props}
      read={(text) => (text.trim() === '' ? { ok: true, value: undefined } : readLength(text, units))}
      write={(inches) => (inches === undefined ? '' : formatLength(inches, units))}
      echo={(inches) => (inches === undefined ? 'Not measured' : echoOf(inches, { units, ...(also && { also }) }))}
    />
  )
}
