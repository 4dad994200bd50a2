import { SceneSvg } from '@/components/drawing/scene-svg'
import { buildScene } from '@/lib/drawing'
import type { Sheet } from '@/lib/spacing'

interface Props {
  sheet: Sheet
  facade: { id: string; name: string }
}

/** A house front in its tenth summer, small: no limits, no letters. */
export function FacadePicture({ sheet, facade }: Props) {
  const scene = buildScene({ sheet, year: 10, bound: 'expected', pxPerInch: 1, show: { limits: false, keys: false, labels: false } })
  return <SceneSvg scene={scene} view="elevation" name={`facade-${facade.id}`} label={`${facade.name} in its tenth summer`} className="h-full" />
}
