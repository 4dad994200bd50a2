/** What the rules about fixtures, doors, trees and fire say. Code figures are reminders: each says who decides. */
import type { Finding, Sheet } from '../types'
import type { Names } from './names'
import { atLargest, by, held, lengthText, sayByDistance, when, type RuleWords, type Say } from './words'

export const CODE_DECIDES = 'Local code and a licensed professional decide.'

const sayService: Say = (finding, names) => {
  const fixture = names.feature(finding.feature)
  const said = sayByDistance(finding, `Leaves room about ${fixture}`, `comes ${by(finding)} into the room kept clear about ${fixture}`)
  return `${said} ${CODE_DECIDES}`
}

function sayNumberView(finding: Finding, names: Names): string {
  const fixture = names.feature(finding.feature)
  if (finding.kind === 'held') return held(`Leaves ${fixture} in sight`, `hides part of it`, finding)
  const share = Math.max(...[finding.measured?.low, finding.measured?.expected, finding.measured?.high].map((part) => part ?? 0))
  const part = share > 0.995 ? 'all' : `${Math.max(1, Math.round(share * 100))} percent`
  return `${atLargest(finding)}hides ${part} of ${fixture}${when(finding)}. Local code asks that it can be seen.`
}

const sayTrees: Say = (finding) => {
  const nearest = finding.measured?.high ?? 0
  const wanted = `a tree of its size wants ${lengthText(finding.limit ?? 0)}`
  return finding.kind === 'conflict' ? `Stands ${lengthText(nearest)} from the wall; ${wanted}.` : `Stands ${lengthText(nearest)} from the wall; at its largest ${wanted}.`
}

const sayThorns: Say = (finding, names) => {
  const feature = names.feature(finding.feature)
  const room = lengthText(finding.limit ?? 0)
  return sayByDistance(finding, `Keeps its thorns off ${feature}`, finding.limit ? `brings its thorns ${by(finding)} into the ${room} kept between thorns and ${feature}` : `brings its thorns ${by(finding)} over ${feature}`)
}

function sayFire(finding: Finding, _: Names, { site }: Sheet): string {
  const zone = `the ${lengthText(finding.limit ?? 0)} kept free of plants before the wall in a wildfire area`
  const law = site.fireZone ? 'Local law decides.' : 'The site is no longer marked as a wildfire area.'
  if (finding.kind === 'held') return `${held(`Keeps out of ${zone}`, `comes ${by(finding)} into it`, finding)} ${law}`
  if (finding.kind === 'risk') return `${atLargest(finding)}reaches ${by(finding)} into ${zone}. ${law}`
  return `Stands ${by(finding)} inside ${zone}. ${law}`
}

export const FIXTURES: Record<string, RuleWords> = {
  service: { say: sayService },
  'number-view': { say: sayNumberView },
  'tree-distance': { say: sayTrees },
  thorns: { say: sayThorns },
  'fire-zone': { say: sayFire },
}
