'use client'
import { parseLength } from '@/lib/measure'
import { LengthField } from './length-field'
import { useMeasure, useThing } from './measure-context'
import { withSoilPoint } from './new-things'
import { ActionButton, FieldGrid, RowTable, Section } from './parts'
import { TypedField, type Read } from './typed-field'

const decimals = (value: number) => Number(value.toFixed(3))

/** The drop over one foot, in any form of a length, as inches per inch. */
function readFall(text: string): Read<number> {
  const drop = parseLength(text.replace(/(\/|\bper\b|\ba\b)\s*(foot|ft)\s*$/i, ''))
  return drop.ok ? { ok: true, value: drop.inches / 12 } : drop
}

/** Heights of the soil along the wall, and how fast it falls away. */
export function SoilSection() {
  const { units, readOnly } = useMeasure()
  const { value: facade, type, choose, leave, problemAt } = useThing('facade')
  const { grade } = facade
  const moved = (i: number, change: Partial<(typeof grade)[number]>) => grade.map((point, at) => (at === i ? { ...point, ...change } : point))
  const addPoint = () => {
    choose({ grade: withSoilPoint(facade) })
  }
  return (
    <Section id="soil" title="Soil" lead="Stretch a level line along the wall and measure down to the soil. Zero is the level you choose: the soil at the left corner is usual.">
      <RowTable headings={['At x', 'Soil above zero', '']} label="Soil along the wall">
        {grade.map((point, i) => (
          <tr key={i}>
            <td>
              <LengthField label="" longLabel={`Soil point ${i + 1}, at x`} units={units} readOnly={readOnly} value={point.x} problem={problemAt('grade', i, 'x')} onValue={(x) => type({ grade: moved(i, { x }) })} onLeave={leave} />
            </td>
            <td>
              <LengthField label="" longLabel={`Soil point ${i + 1}, above zero`} units={units} readOnly={readOnly} value={point.z} problem={problemAt('grade', i, 'z')} onValue={(z) => type({ grade: moved(i, { z }) })} onLeave={leave} />
            </td>
            <td>
              {grade.length > 1 && !readOnly ? (
                <ActionButton kind="quiet" label={`Remove soil point ${i + 1}`} onPress={() => choose({ grade: grade.toSpliced(i, 1) })}>Remove</ActionButton>
              ) : null}
            </td>
          </tr>
        ))}
      </RowTable>
      {readOnly ? null : <ActionButton kind="plain" onPress={addPoint}>Add a soil point</ActionButton>}
      <FieldGrid>
        <TypedField<number>
          label="Fall in inches per foot"
          readOnly={readOnly}
          value={facade.fall}
          read={readFall}
          write={(fall) => `${decimals(fall * 12)} in`}
          echo={(fall) => (fall < 0 ? `the soil rises ${decimals(fall * -100)} %: water runs to the wall` : `the soil drops ${decimals(fall * 100)} %`)}
          problem={problemAt('fall')}
          hint="away from the wall"
          onValue={(fall) => type({ fall })}
          onLeave={leave}
        />
      </FieldGrid>
    </Section>
  )
}
