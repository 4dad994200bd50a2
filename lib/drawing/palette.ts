/**
 * Every ink a drawing may use, by name, and its colour in both themes. Lines and marks that carry meaning stand
 * at 3:1 or more against the sheet, inks used for text at 4.5:1 or more (outdoors 7:1); fills are always edged by ink.
 */

export const INKS = [
  'paper', 'sheet', 'rule', 'ink', 'ink-soft', 'leaf', 'conflict', 'risk', 'held', 'note',
  'sill-line', 'gutter-line', 'walk-edge', 'wall-gap', 'drip-line',
  'wall', 'siding', 'siding-line', 'masonry', 'masonry-line', 'foundation', 'trim', 'roof', 'roof-line',
  'glass', 'glass-light', 'door', 'door-panel', 'metal', 'soil', 'mulch', 'mulch-dot', 'paving', 'paving-line', 'bark',
  'foliage-green', 'foliage-dark-green', 'foliage-light-green', 'foliage-blue-green', 'foliage-silver', 'foliage-gold',
  'foliage-purple', 'foliage-red', 'foliage-bronze', 'foliage-variegated-white', 'foliage-variegated-yellow',
  'foliage-fresh', 'foliage-fall', 'foliage-straw', 'foliage-shade', 'foliage-lit',
  'bloom-white', 'bloom-pink', 'bloom-red', 'bloom-orange', 'bloom-yellow', 'bloom-green', 'bloom-blue', 'bloom-purple',
] as const

export type Ink = (typeof INKS)[number]
export const THEMES = ['paper', 'outdoors'] as const
export type Theme = (typeof THEMES)[number]
type Hex = `#${string}`

/** Inks that are used for text. */
export const TEXT_INKS = ['ink', 'ink-soft', 'leaf', 'conflict', 'held', 'note', 'sill-line', 'gutter-line', 'walk-edge', 'wall-gap', 'drip-line'] as const satisfies readonly Ink[]
/** Inks of lines and marks that carry meaning. */
export const MARK_INKS = [...TEXT_INKS, 'risk', 'wall', 'bark'] as const satisfies readonly Ink[]

export const PAPER: Record<Ink, Hex> = {
  paper: '#f5f1e6', sheet: '#fffdf7', rule: '#d9d2bf', ink: '#1d2a22', 'ink-soft': '#5c665d', leaf: '#2f5d43',
  conflict: '#a23b2a', risk: '#b9770e', held: '#3e6486', note: '#6f6b62',
  'sill-line': '#8f4510', 'gutter-line': '#2c5d84', 'walk-edge': '#6a4596', 'wall-gap': '#8a2f62', 'drip-line': '#4c6b70',
  wall: '#6d675a', siding: '#f6efe0', 'siding-line': '#dccfb6', masonry: '#e6cdbb', 'masonry-line': '#c9a994',
  foundation: '#d6d0c1', trim: '#fffdf8', roof: '#dfd8c6', 'roof-line': '#c3b99f',
  glass: '#dfe8ea', 'glass-light': '#f1f6f5', door: '#7c3b31', 'door-panel': '#93503f', metal: '#c4c6bf',
  soil: '#8b7a62', mulch: '#eadfcd', 'mulch-dot': '#b79c78', paving: '#ebe8e0', 'paving-line': '#c9c4b6', bark: '#6b5240',
  'foliage-green': '#9db88a', 'foliage-dark-green': '#6f9176', 'foliage-light-green': '#bfd09a', 'foliage-blue-green': '#8fada5',
  'foliage-silver': '#bcc6bb', 'foliage-gold': '#d9c668', 'foliage-purple': '#937087', 'foliage-red': '#b26a5e',
  'foliage-bronze': '#ac8a63', 'foliage-variegated-white': '#c3d2b9', 'foliage-variegated-yellow': '#cdd187',
  'foliage-fresh': '#c4d8a0', 'foliage-fall': '#d39a55', 'foliage-straw': '#ddcda2', 'foliage-shade': '#2b463a', 'foliage-lit': '#fffbe6',
  'bloom-white': '#fffefa', 'bloom-pink': '#e7a3b6', 'bloom-red': '#c43b3f', 'bloom-orange': '#e08a3c', 'bloom-yellow': '#f0cf4e',
  'bloom-green': '#cfdc9a', 'bloom-blue': '#6f88c9', 'bloom-purple': '#8d62a8',
}

/** For reading in the sun: black on white, strong lines, pale fills kept apart by lightness. */
export const OUTDOORS: Record<Ink, Hex> = {
  ...PAPER,
  paper: '#ffffff', sheet: '#ffffff', rule: '#767676', ink: '#000000', 'ink-soft': '#2b2b2b', leaf: '#0d3d22',
  conflict: '#8a1200', risk: '#8a5200', held: '#123f66', note: '#3d3d3d',
  'sill-line': '#6b2d00', 'gutter-line': '#003f6b', 'walk-edge': '#47217a', 'wall-gap': '#6b0f44', 'drip-line': '#1f4348',
  wall: '#3d3d3d', siding: '#ffffff', 'siding-line': '#c9c9c9', masonry: '#f2e6de', 'masonry-line': '#b59c8c',
  foundation: '#dcdcdc', trim: '#ffffff', roof: '#ededed', 'roof-line': '#bdbdbd', glass: '#e3eef2', 'glass-light': '#f7fbfb',
  door: '#6b2419', 'door-panel': '#7f3a2b', metal: '#bdbdbd', soil: '#4d4030', mulch: '#f5efe3', 'mulch-dot': '#8f7550',
  paving: '#efefef', 'paving-line': '#a9a9a9', bark: '#3f2a1a', 'foliage-shade': '#10241a',
}

export const PALETTES: Record<Theme, Record<Ink, Hex>> = { paper: PAPER, outdoors: OUTDOORS }

/** Relative luminance of a colour, 0-1 (WCAG 2). */
function luminance(hex: string): number {
  const channel = (at: number) => {
    const value = Number.parseInt(hex.slice(at, at + 2), 16) / 255
    return value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4
  }
  return 0.2126 * channel(1) + 0.7152 * channel(3) + 0.0722 * channel(5)
}

/** Contrast of two colours, 1-21 (WCAG 2). */
export function contrast(a: string, b: string): number {
  const [light, dark] = [luminance(a), luminance(b)].sort((one, two) => two - one) as [number, number]
  return (light + 0.05) / (dark + 0.05)
}
