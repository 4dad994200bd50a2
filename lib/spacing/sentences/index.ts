/** All that the check says, in plain sentences made from its data. No sentence stands anywhere else. */
import type { Finding, Sheet } from '../types'
import { CLEARANCES } from './clearances'
import { COMPOSITION } from './composition'
import { FIXTURES } from './fixtures'
import { GROUND } from './ground'
import { Names } from './names'
import { NEIGHBOURS } from './neighbours'
import { SITE } from './site'
import { describeRemedy } from './ways-out'
import type { RuleWords } from './words'

export { describeMiss, describeRemedy, NO_WAY_OUT } from './ways-out'
export { lengthText, shareText, yearsText } from './words'

export interface Description {
  /** Who or what it is about: plants by their botanical names. */
  title: string
  sentence: string
  /** The first way out, where ways out were looked for and found; else ''. */
  wayOut: string
}

const WORDS: Record<string, RuleWords> = { ...CLEARANCES, ...FIXTURES, ...NEIGHBOURS, ...COMPOSITION, ...SITE, ...GROUND }

/** A finding in words: who, what, by how much, when. Names what is no longer on the sheet as such. */
export function describe(finding: Finding, sheet: Sheet): Description {
  const names = Names.of(sheet)
  const words = WORDS[finding.rule]
  const sentence = words ? words.say(finding, names, sheet) : `Judged by a rule this version does not know: ${finding.rule}.`
  const plants = () => [...new Set(finding.placements.map((id) => names.plant(id)))].join(' and ')
  const [first] = finding.remedies
  return { title: words?.title?.(finding, names, sheet) ?? plants(), sentence, wayOut: first ? describeRemedy(first, finding, sheet) : '' }
}
