/** The soil before the house: heights on the z axis, inches. */
import type { Facade, GradePoint, Inches } from '../types'
import { wallDistance } from './wall'

/** Soil height at the wall: linear between the measured points, flat beyond them. */
export function gradeAt({ grade }: { grade: readonly GradePoint[] }, x: Inches): Inches {
  const first = grade[0]!
  if (x <= first.x) return first.z
  for (let i = 1; i < grade.length; i++) {
    const a = grade[i - 1]!
    const b = grade[i]!
    if (x <= b.x) return a.z + ((b.z - a.z) * (x - a.x)) / (b.x - a.x)
  }
  return grade[grade.length - 1]!.z
}

/** Soil height at a point in plan: the soil at the wall less the fall over the distance from it; level behind it. */
export function groundAt(facade: Pick<Facade, 'wall' | 'grade' | 'fall'>, x: Inches, y: Inches): Inches {
  return gradeAt(facade, x) - facade.fall * Math.max(0, wallDistance(facade, x, y))
}
