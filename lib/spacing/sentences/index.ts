/** All that the check says, in plain sentences made from its data. No sentence stands anywhere else. */
import type { Finding, Sheet } from '../types'
import { CLEARANCES } from './clearances'
import { Names } from './names'
import { NEIGHBOURS } from './neighbours'
import { SITE } from './site'
import type { RuleWords } from './words'

export { lengthText, shareText, yearsText } from './words'

export interface Description {
  /** Who or what it is about: plants by their botanical names. */
  title: string
  sentence: string
  /** What could be done, where the check has found something; '' where it has looked for nothing. */
  wayOut: string
}

const WORDS: Record<string, RuleWords> = { ...CLEARANCES, ...NEIGHBOURS, ...SITE }

/** A finding in words: who, what, by how much, when. Names what is no longer on the sheet as such. */
export function describe(finding: Finding, sheet: Sheet): Description {
  const names = new Names(sheet)
  const words = WORDS[finding.rule]
  const sentence = words ? words.say(finding, names, sheet) : `Judged by a rule this version does not know: ${finding.rule}.`
  const plants = () => [...new Set(finding.placements.map((id) => names.plant(id)))].join(' and ')
  return { title: words?.title?.(finding, names, sheet) ?? plants(), sentence, wayOut: '' }
}
