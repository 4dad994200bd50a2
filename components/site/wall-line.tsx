'use client'
import { steppedWallOf, wallOf, type WallStep } from '@/lib/sheet'
import { LengthField } from './length-field'
import { useMeasure, useThing } from './measure-context'
import { ActionButton, RowTable } from './parts'
import { PointRows } from './point-rows'

/** The wall line as stretches that stand out by so much, or by its points where a stretch runs askew. */
export function WallLine() {
  const { units, readOnly } = useMeasure()
  const { value: facade, type, choose, leave, problemAt } = useThing('facade')
  const stepped = steppedWallOf(facade.wall)
  if (!stepped) {
    return (
      <div className="mt-4">
        <h3 className="font-heading text-lg">Wall line, point by point</h3>
        <PointRows points={facade.wall} least={2} what="Wall point" problemAt={(i, axis) => problemAt('wall', i, axis)} onType={(wall) => type({ wall })} onChoose={(wall) => choose({ wall })} onLeave={leave} />
      </div>
    )
  }
  const { steps, end } = stepped
  const withStep = (i: number, change: Partial<WallStep>) => wallOf({ steps: steps.map((step, at) => (at === i ? { ...step, ...change } : step)), end })
  // A jog is two points of one x: the first of them carries the sentence about its place.
  const fromProblem = (i: number) => (i === 0 ? problemAt('wall', 0, 'x') : (problemAt('wall', 2 * i - 1, 'x') ?? problemAt('wall', 2 * i, 'x')))
  const addJog = () => {
    const last = steps.at(-1)!
    choose({ wall: wallOf({ steps: [...steps, { from: Math.round((last.from + end) / 2), out: last.out + 12 }], end }) })
  }
  return (
    <div className="mt-4">
      <h3 className="font-heading text-lg">Wall line</h3>
      <p className="text-sm text-ink-soft">One row for each straight stretch. A stretch that stands in front of the base line has a number above 0.</p>
      <RowTable headings={['From x', 'Stands out', '']} label="Wall line">
        {steps.map((step, i) => (
          <tr key={i}>
            <td>
              <LengthField label="" longLabel={`Stretch ${i + 1}, from x`} units={units} readOnly={readOnly} value={step.from} problem={fromProblem(i)} onValue={(from) => type({ wall: withStep(i, { from }) })} onLeave={leave} />
            </td>
            <td>
              <LengthField label="" longLabel={`Stretch ${i + 1}, stands out`} units={units} readOnly={readOnly} value={step.out} problem={problemAt('wall', 2 * i, 'y')} onValue={(out) => type({ wall: withStep(i, { out }) })} onLeave={leave} />
            </td>
            <td>
              {steps.length > 1 && i > 0 && !readOnly ? (
                <ActionButton kind="quiet" label={`Remove stretch ${i + 1}`} onPress={() => choose({ wall: wallOf({ steps: steps.filter((_, at) => at !== i), end }) })}>
                  Remove
                </ActionButton>
              ) : null}
            </td>
          </tr>
        ))}
      </RowTable>
      {readOnly ? null : <ActionButton kind="plain" onPress={addJog}>Add a jog</ActionButton>}
    </div>
  )
}
