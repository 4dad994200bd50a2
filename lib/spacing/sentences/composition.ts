/** What the rules about a whole bed say. */
import { bloomGaps } from '../by-bed'
import { pointInPolygon } from '../geometry/polygon'
import type { Finding } from '../types'
import { by, lengthText, shareText, type RuleWords, type Say } from './words'

const MONTHS = ['January', 'February', 'March', 'April', 'May', 'June', 'July', 'August', 'September', 'October', 'November', 'December']

const aboutFeature: Say = ({ feature }, names) => names.feature(feature)
const expectedOf = ({ measured }: Finding): number => measured?.expected ?? 0
const listed = (words: readonly string[]) => (words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} and ${words.at(-1)}`)
const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1)
const corner = ({ feature }: Finding) => `the ${feature === 'right' ? 'right' : 'left'} corner of the house`

const sayCorner: Say = (finding) => {
  if (finding.placements.length === 0) return `Nothing here grows ${lengthText(finding.limit ?? 0)} high to close the corner.`
  const above = `${by(finding)} above the ${lengthText(finding.limit ?? 0)} that suit`
  return finding.kind === 'held' ? `Suits ${corner(finding)} only while kept clipped. Left alone it grows ${above} it.` : `Grows ${above} ${corner(finding)}.`
}

const sayEntry: Say = (finding, names) => {
  const door = names.feature(finding.feature)
  const over = `${by(finding)} over the ${lengthText(finding.limit ?? 0)} that leave the view of ${door} open`
  return finding.kind === 'held' ? `Leaves the view of ${door} open only while kept clipped. Left alone it grows ${over}.` : `Grows ${over}.`
}

/** What only shears keep from being so is told as that. */
const unlessClipped = ({ kind }: Finding, sentence: string) => (kind === 'held' ? `Otherwise only while kept clipped. Left alone: ${sentence}` : sentence)

const sayCover: Say = (finding) => `Grown up, plants cover ${shareText(expectedOf(finding))} of the bed; the rest stays bare soil or mulch. ${shareText(finding.limit ?? 0)} closes it.`

const sayEvergreen: Say = (finding) => {
  const share = `Of its woody plants ${shareText(expectedOf(finding))} are evergreen by volume`
  return expectedOf(finding) < (finding.limit ?? 0) ? `${share}: bare in winter. A third is usual.` : `${share}: much alike all year. Two thirds is usual at most.`
}

const sayBloom: Say = ({ feature }, names, sheet) => {
  const bed = sheet.beds.find(({ id }) => id === feature)
  const plants = bed ? sheet.placements.filter((one) => one.status !== 'goes' && pointInPolygon(one, bed.outline)).flatMap(({ id }) => names.plantOf(id) ?? []) : []
  const months = bed ? bloomGaps(plants).map((month) => MONTHS[month - 1]!) : []
  return months.length > 0 ? `Nothing flowers in ${listed(months)}.` : 'Something flowers in every month from April to October now.'
}

const sayBalance: Say = (finding) => {
  const left = expectedOf(finding)
  const [heavy, share] = left > 0.5 ? ['left', left] : ['right', 1 - left]
  return `The ${heavy} side carries ${shareText(share)} of the weight about the middle of the bed.`
}

export const COMPOSITION: Record<string, RuleWords> = {
  'corner-height': { say: sayCorner, title: (finding, names) => (finding.placements.length === 0 ? capital(corner(finding)) : names.plant(finding.placements[0])) },
  'entry-height': { say: sayEntry },
  cover: { say: (finding, ...rest) => unlessClipped(finding, sayCover(finding, ...rest)), title: aboutFeature },
  'evergreen-share': { say: (finding, ...rest) => unlessClipped(finding, sayEvergreen(finding, ...rest)), title: aboutFeature },
  'bloom-gaps': { say: sayBloom, title: aboutFeature },
  'same-green': { say: (finding) => `Side by side stand ${expectedOf(finding)} plants of one leaf color and one texture.`, title: aboutFeature },
  'odd-drift': { say: (finding) => `A drift of ${expectedOf(finding)}: odd numbers look less set out.` },
  balance: { say: (finding, ...rest) => unlessClipped(finding, sayBalance(finding, ...rest)), title: aboutFeature },
  'native-share': { say: (finding) => unlessClipped(finding, `Native plants are ${shareText(expectedOf(finding))} of the planting by volume; birds raise young where it is ${shareText(finding.limit ?? 0)} or more.`), title: aboutFeature },
}
