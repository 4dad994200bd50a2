/** What the rules between plants say. */
import { atLargest, by, held, lengthText, when, type RuleWords, type Say } from './words'

const sayCrowding: Say = (finding, names) => {
  const [a, b] = finding.placements.map((id) => names.plant(id))
  const pair = a === b ? 'These two' : `${a} and ${b}`
  const most = `${by(finding)} more than they may`
  if (finding.kind === 'held') return `${pair} fit side by side only while kept clipped. Left alone they overlap by ${most}${when(finding)}.`
  return finding.kind === 'risk' ? `At their largest they overlap by ${most}${when(finding)}.` : `They overlap by ${most}${when(finding)}.`
}

const sayLayers: Say = (finding, names) => {
  const behind = names.plant(finding.placements[1])
  // The rise is told whole, not what is left of it above the rise a studio allows.
  const rise = lengthText(finding.excess + (finding.limit ?? 0))
  const rises = `rises ${rise} above ${behind} behind it`
  if (finding.kind === 'held') return held(finding.limit ? `Keeps its place before ${behind}` : `Stays below ${behind} behind it`, `rises ${rise} above it`, finding)
  if (finding.kind === 'note') return `A specimen: it ${rises}${when(finding)}.`
  return `${atLargest(finding)}${rises}${when(finding)}.`
}

const sayOpenDrift: Say = (finding) =>
  `Stands ${lengthText(finding.measured?.expected ?? 0)} from the nearest of its drift, ${by(finding)} too far to grow together.`

export const NEIGHBOURS: Record<string, RuleWords> = {
  'open-drift': { say: sayOpenDrift },
  crowding: { say: sayCrowding },
  'layer-order': { say: sayLayers, title: ({ placements }, names) => names.plant(placements[0]) },
}
