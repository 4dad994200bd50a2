/** One plant square-on: silhouette, season, texture, flowers. */
import type { Plant } from '../plants'
import { matureSize, type Crown, type Placement } from '../spacing'
import { drawSilhouette, envelopeOf, type Edge, type EdgeStyle, type Envelope, type Place } from './envelope'
import { lookOf, type Look } from './foliage'
import type { Ink } from './palette'
import { line, path } from './path'
import { randomFrom } from './random'
import { bareBranches, bladeStrokes, flowerDots, leafMasses, penFor, stems, textureStrokes, tierStrokes, type Pen } from './strokes'
import type { Box, PathShape, PlantDrawing } from './types'

const BUMP_IN = { fine: 7, medium: 9, coarse: 13 } as const
const DEPTH_SHARE = { fine: 0.045, medium: 0.06, coarse: 0.09 } as const

export interface Subject {
  plant: Plant
  placement: Placement
  crown: Crown
  month: number
}

const isNeedled = ({ leaf }: Plant) => leaf === 'needle-evergreen'
const isBladed = ({ category }: Plant) => category === 'grass'
const isFronded = ({ category, habit }: Plant) => category === 'fern' || habit === 'weeping' || habit === 'arching'

function edgeOf(plant: Plant): Edge {
  if (isBladed(plant)) return 'bladed'
  return isNeedled(plant) ? 'spiky' : 'leafy'
}

/** The edge's style is reckoned from the full-grown plant, so that it grows and never re-rolls. */
function styleOf({ plant, placement }: Subject, envelope: Envelope): EdgeStyle {
  const mature = matureSize(plant, placement, 'expected')
  const reach = mature.height + mature.spread / 2
  const edge = edgeOf(plant)
  const bump = BUMP_IN[plant.texture] * (edge === 'leafy' ? 1 : 0.75) * Math.max(1, Math.sqrt(reach / 90))
  return {
    edge,
    bumps: Math.min(22, Math.max(4, Math.round(reach / bump))),
    depth: Math.max(0.3, Math.min(envelope.widest, envelope.top - envelope.bottom) * DEPTH_SHARE[plant.texture] * (edge === 'bladed' ? 3 : plant.leaf === 'herbaceous' ? 1.9 : 1)),
  }
}

function inkOf(placement: Placement): Ink {
  return placement.status === 'stays' ? 'ink-soft' : 'ink'
}

function wood(subject: Subject, envelope: Envelope, pen: Pen): PathShape[] {
  const { plant, placement, crown } = subject
  const clear = crown.clearStem >= 1
  if (!clear && plant.category !== 'tree') return []
  const many = plant.habit === 'multi-stem' ? 3 : 1
  const d = stems(envelope, many, randomFrom(`${placement.id} stems`), pen)
  return [
    path(d, { stroke: 'ink', strokePx: many > 1 ? 3.2 : 4.6, cap: 'butt' }),
    path(d, { stroke: 'bark', strokePx: many > 1 ? 1.8 : 3, cap: 'butt' }),
  ]
}

function inside({ plant, placement }: Subject, envelope: Envelope, pen: Pen): string {
  const random = randomFrom(`${placement.id} texture`)
  if (isBladed(plant)) return bladeStrokes(envelope, random, pen, 0.3)
  if (isFronded(plant)) return bladeStrokes(envelope, random, pen, 0.6) + textureStrokes(envelope, plant.texture, random, pen)
  if (isNeedled(plant) && plant.habit === 'pyramidal') return tierStrokes(envelope, random, pen)
  if (plant.category === 'perennial' && plant.texture !== 'coarse') return bladeStrokes(envelope, random, pen, 0.2)
  if (isNeedled(plant)) return textureStrokes(envelope, plant.texture, random, pen)
  return leafMasses(envelope, random, pen) + textureStrokes(envelope, plant.texture, random, pen)
}

function flowers({ placement }: Subject, look: Look, envelope: Envelope, pen: Pen): PathShape[] {
  if (look.bloom.length === 0) return []
  const paths = flowerDots(envelope, look.bloom.length, randomFrom(`${placement.id} flowers`), pen)
  return look.bloom.map((ink, i) => path(paths[i]!, { fill: ink, stroke: 'ink-soft', strokePx: 0.5 }))
}

function inLeaf(subject: Subject, look: Look, envelope: Envelope, place: Place): PathShape[] {
  const { placement } = subject
  const pen = penFor(place)
  const { outline, shade } = drawSilhouette(envelope, styleOf(subject, envelope), randomFrom(placement.id), place)
  const stays = placement.status === 'stays'
  const thin = look.dress === 'thin'
  return [
    ...wood(subject, envelope, pen),
    path(outline, { fill: 'sheet', opacity: thin ? 0.35 : 1 }),
    path(outline, { fill: look.fill, opacity: thin ? 0.4 : stays ? 0.7 : 0.96 }),
    path(shade, { fill: 'foliage-shade', opacity: thin ? 0.06 : 0.15 }),
    path(inside(subject, envelope, pen), { stroke: inkOf(placement), strokePx: 0.75, opacity: 0.5, cap: 'round' }),
    ...flowers(subject, look, envelope, pen),
    path(outline, { stroke: inkOf(placement), strokePx: stays ? 0.9 : 1.15 }),
  ]
}

function bare(subject: Subject, look: Look, envelope: Envelope, place: Place): PathShape[] {
  const { plant, placement } = subject
  const pen = penFor(place)
  const single = plant.category === 'tree' && plant.habit !== 'multi-stem'
  const { trunk, limbs, twigs } = bareBranches(envelope, single, randomFrom(`${placement.id} wood`), pen)
  const { outline } = drawSilhouette(envelope, styleOf(subject, envelope), randomFrom(placement.id), place)
  return [
    path(outline, { fill: 'foliage-straw', opacity: 0.1 }),
    path(outline, { stroke: 'ink-soft', strokePx: 0.7, dashPx: [1, 3], opacity: 0.9 }),
    ...(trunk ? [path(trunk, { stroke: 'bark', strokePx: 3.2, cap: 'round' as const })] : []),
    path(twigs, { stroke: 'bark', strokePx: 0.7, cap: 'round' }),
    path(limbs, { stroke: 'bark', strokePx: 1.3, cap: 'round' }),
    ...flowers(subject, look, envelope, pen),
  ]
}

function dormant(subject: Subject, envelope: Envelope, place: Place): PathShape[] {
  const { outline } = drawSilhouette(envelope, styleOf(subject, envelope), randomFrom(subject.placement.id), place)
  return [
    path(outline, { fill: 'foliage-straw', opacity: 0.35 }),
    path(outline, { stroke: 'ink-soft', strokePx: 1, dashPx: [4, 3] }),
  ]
}

/** A plant that goes: its outline dashed, crossed out. */
function leaving(envelope: Envelope, place: Place): PathShape[] {
  const style: EdgeStyle = { edge: 'leafy', bumps: 10, depth: envelope.widest * 0.05 }
  const { outline } = drawSilhouette(envelope, style, randomFrom('goes'), place)
  const { bottom, top, widest } = envelope
  const corner = (x: number, z: number) => place({ x: x * widest * 0.7, z: bottom + (top - bottom) * z })
  return [
    path(outline, { fill: 'sheet', opacity: 0.35 }),
    path(outline, { stroke: 'ink-soft', strokePx: 1, dashPx: [5, 4] }),
    path(line([corner(-1, 0.12), corner(1, 0.88)]) + line([corner(-1, 0.88), corner(1, 0.12)]), { stroke: 'ink-soft', strokePx: 1 }),
  ]
}

function shapesOf(subject: Subject, envelope: Envelope, place: Place): PathShape[] {
  if (subject.placement.status === 'goes') return leaving(envelope, place)
  const look = lookOf(subject.plant, subject.month)
  if (look.dress === 'bare') return bare(subject, look, envelope, place)
  if (look.dress === 'dormant') return dormant(subject, envelope, place)
  return inLeaf(subject, look, envelope, place)
}

/**
 * One plant in the elevation. Everything but stems lies within the crown; the drawn edge touches the crown's
 * true outline at every leaf.
 * @param elevationY scene y of a height.
 */
export function drawPlantElevation(subject: Subject, elevationY: (z: number) => number): PlantDrawing {
  const { crown, placement, plant } = subject
  const envelope = envelopeOf(crown)
  const place: Place = ({ x, z }) => ({ x: crown.x + x, y: elevationY(z) })
  const hit: Box = {
    x: crown.x - envelope.widest, y: elevationY(envelope.top), width: 2 * envelope.widest, height: envelope.top - crown.z0,
  }
  return {
    placement: placement.id, plant: plant.id, at: { x: crown.x, y: elevationY(crown.z0) }, hit,
    shapes: shapesOf(subject, envelope, place), depth: placement.y,
  }
}
