'use client'
import { useDeferredValue, useMemo } from 'react'
import { SceneSvg } from '@/components/drawing/scene-svg'
import { buildScene } from '@/lib/drawing'
import { useMeasure } from './measure-context'

/** The sheet as it is typed, elevation above plan, with the plants as they are planted. */
export function MeasureDrawing({ label }: { label: string }) {
  const { state } = useMeasure()
  const sheet = useDeferredValue(state.shown)
  const scene = useMemo(() => buildScene({ sheet, year: 0, bound: 'expected', pxPerInch: 1, show: { limits: true, keys: false, labels: true } }), [sheet])
  return <SceneSvg scene={scene} view="both" label={label} />
}
