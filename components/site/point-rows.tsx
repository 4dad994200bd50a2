'use client'
import type { Point } from '@/lib/spacing'
import { LengthField } from './length-field'
import { useMeasure } from './measure-context'
import { ActionButton, RowTable } from './parts'

interface Props {
  points: readonly Point[]
  /** Fewer points than this are no line or outline: none can be removed then. */
  least: number
  /** What a row is called: "Wall point", "Corner". */
  what: string
  problemAt: (i: number, axis: 'x' | 'y') => string | null
  onType: (points: Point[]) => void
  onChoose: (points: Point[]) => void
  onLeave: () => void
}

/** A line or outline as a table of its points. A new point stands halfway to the next one. */
export function PointRows({ points, least, what, problemAt, onType, onChoose, onLeave }: Props) {
  const { units, readOnly } = useMeasure()
  const moved = (i: number, change: Partial<Point>) => points.map((point, at) => (at === i ? { ...point, ...change } : point))
  const addAfter = (i: number) => {
    const next = points[(i + 1) % points.length]!
    const here = points[i]!
    onChoose(points.toSpliced(i + 1, 0, { x: (here.x + next.x) / 2, y: (here.y + next.y) / 2 }))
  }
  return (
    <RowTable headings={['Along the wall', 'Out from base line', '']} label={`${what}s`}>
      {points.map((point, i) => (
        <tr key={i}>
          {(['x', 'y'] as const).map((axis) => (
            <td key={axis}>
              <LengthField
                label=""
                longLabel={`${what} ${i + 1}, ${axis === 'x' ? 'along the wall' : 'out from the base line'}`}
                units={units}
                readOnly={readOnly}
                value={point[axis]}
                problem={problemAt(i, axis)}
                onValue={(inches) => onType(moved(i, { [axis]: inches }))}
                onLeave={onLeave}
              />
            </td>
          ))}
          <td>
            {readOnly ? null : (
              <span className="flex gap-1">
                <ActionButton kind="quiet" label={`Add a point after ${what.toLowerCase()} ${i + 1}`} onPress={() => addAfter(i)}>Add after</ActionButton>
                {points.length > least ? (
                  <ActionButton kind="quiet" label={`Remove ${what.toLowerCase()} ${i + 1}`} onPress={() => onChoose(points.toSpliced(i, 1))}>Remove</ActionButton>
                ) : null}
              </span>
            )}
          </td>
        </tr>
      ))}
    </RowTable>
  )
}
