/** What the rules about house, walk and bed edge say. */
import { CONTACT } from '../geometry/contact'
import type { Finding, Sheet } from '../types'
import type { Names } from './names'
import { atLargest, by, expectedKeeps, held, lengthText, sayByDistance, when, type RuleWords, type Say } from './words'

/** The line a crown may not pass: the sill, or as far below it as the studio keeps free. */
function sillLine({ feature, limit }: Finding, names: Names, { openings }: Sheet): string {
  const sill = `the sill of ${names.feature(feature)}`
  const window = openings.find(({ id }) => id === feature)
  const margin = window && limit !== null ? window.sill - limit : 0
  return margin > CONTACT ? `the line ${lengthText(margin)} below ${sill}` : sill
}

const saySill: Say = (finding, names, sheet) => {
  const limit = sillLine(finding, names, sheet)
  if (finding.kind === 'held') return held(`Stays below ${limit}`, `goes ${by(finding)} past it`, finding)
  if (finding.kind === 'note') return `Stands well out from the wall, yet goes ${by(finding)} past ${limit}${when(finding)}.`
  return `${atLargest(finding)}goes ${by(finding)} past ${limit}${when(finding)}.${expectedKeeps(finding, 'below it')}`
}

const sayGutter: Say = (finding) => {
  const reaches = `comes ${by(finding)} into the room kept free below the gutter`
  if (finding.kind === 'held') return held('Keeps clear of the gutter', reaches, finding)
  return `${atLargest(finding)}${reaches}${when(finding)}.${expectedKeeps(finding, 'below it')}`
}

const sayWalkEdge: Say = (finding, names) => {
  const walk = names.feature(finding.feature)
  if (finding.year?.latest === 0 && (finding.measured?.low ?? 0) < 0 && finding.excess > 0 && finding.kind === 'conflict') {
    return `Stands in or over ${walk} from the day it is planted, ${lengthText(finding.excess - (finding.limit ?? 0))} past its edge when grown.`
  }
  const limit = finding.limit ? `comes ${by(finding)} into the ${lengthText(finding.limit)} kept clear beside ${walk}` : `leans ${by(finding)} over ${walk}`
  return sayByDistance(finding, `Clears ${walk}`, limit)
}

/** Where a studio keeps no gap, the crown may touch the wall and no more. */
function sayTouch(finding: Finding): string {
  if (finding.kind === 'note') return `Grows against the wall, but stays below the siding${when(finding)}.`
  return sayByDistance(finding, 'Keeps off the wall', `presses ${by(finding)} into the wall`)
}

const sayWallGap: Say = (finding) => {
  if (!finding.limit) return sayTouch(finding)
  const gap = lengthText(finding.limit)
  if (finding.kind === 'note') return `Comes within ${gap} of the wall, but stays below the siding${when(finding)}.`
  return sayByDistance(finding, `Keeps ${gap} off the wall`, `comes ${by(finding)} into the ${gap} kept free in front of the wall`)
}

export const CLEARANCES: Record<string, RuleWords> = {
  sill: { say: saySill },
  gutter: { say: sayGutter },
  'walk-edge': { say: sayWalkEdge },
  'wall-gap': { say: sayWallGap },
  'outside-bed': { say: (finding) => `Stands ${by(finding)} outside the nearest bed.` },
}
