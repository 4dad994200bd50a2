import { judgeExpected } from '../expected-only'
import { numberOf } from '../prepared'
import type { Rule } from '../rule'
import { toDoorLine } from './thorns'

export const entryHeight: Rule = {
  scope: 'sheet',
  meta: {
    id: 'entry-height',
    title: 'By the door',
    question: 'Can one see who stands at the door?',
    settings: [
      { name: 'entry-height.near', label: 'By the door within', default: 72, min: 0, max: 180, unit: 'in' },
      { name: 'entry-height.height', label: 'Height allowed there', default: 36, min: 12, max: 96, unit: 'in' },
      { name: 'entry-height.clear', label: 'Or foliage starting above', default: 72, min: 36, max: 120, unit: 'in' },
    ],
    fixedKind: 'risk',
    sources: [{ publisher: 'City of SeaTac, Washington', title: 'Municipal Code 17.56.020: nothing over 3 ft within 6 ft of a doorway', address: 'https://www.codepublishing.com/WA/SeaTac/html/SeaTac17/SeaTac1756.html', known: 'read' }],
    notes: 'Heights are above the plant\'s own soil, at the expected size. One city\'s code, taken as a good habit.',
  },
  judge: (prepared) => {
    const [near, limit, clear] = ['near', 'height', 'clear'].map((name) => numberOf(prepared, `entry-height.${name}`)) as [number, number, number]
    const doors = prepared.sheet.openings.filter(({ kind }) => kind === 'door')
    return prepared.grown.flatMap((one) =>
      doors.filter((door) => toDoorLine(prepared.sheet.facade, door, one.placement) <= near).flatMap((door) =>
        judgeExpected({ rule: 'entry-height', one, feature: door.id, limit, measure: (crown) => (crown.clearStem >= clear ? null : crown.height) }) ?? [],
      ),
    )
  },
}
