/** What the rules about ground and water say: they name no plants. */
import { CODE_DECIDES } from './fixtures'
import { lengthText, type RuleWords, type Say } from './words'

const sayFall: Say = ({ measured, limit }) => {
  const drop = measured?.expected ?? 0
  const falls = Math.abs(drop) < 0.25 ? 'lies level' : drop < 0 ? `rises ${lengthText(drop)}` : `falls only ${lengthText(drop)}`
  return `The soil ${falls} over the first 10 ft from the wall; ${lengthText(limit ?? 0)} of fall carries water away. ${CODE_DECIDES}`
}

const saySiding: Say = ({ measured, limit }) => {
  const showing = measured?.expected ?? 0
  const shows = showing <= 0 ? 'No foundation shows above the mulch' : `Only ${lengthText(showing)} of foundation shows above the mulch`
  return `${shows}; ${lengthText(limit ?? 0)} keeps the wall dry and in sight. ${CODE_DECIDES}`
}

const sayDownspout: Say = ({ measured, limit }) =>
  `Roof water leaves ${lengthText(measured?.expected ?? 0)} from the wall; ${lengthText(limit ?? 0)} keeps it off the foundation. ${CODE_DECIDES}`

export const GROUND: Record<string, RuleWords> = {
  'ground-fall': { say: sayFall, title: () => 'Fall of the ground' },
  'siding-gap': { say: saySiding, title: () => 'Foundation showing' },
  downspout: { say: sayDownspout, title: () => 'Downspout' },
}
