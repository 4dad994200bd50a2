/**
 * The vocabulary of a drawing. A scene is one sheet with two views of one scale: the elevation above, the plan
 * below, sharing x. Scene coordinates are inches, x to the right as on the facade, y DOWN. What people must be
 * able to read or touch (stroke widths, text, marks, dashes) is in screen pixels, constant under zoom.
 */
import type { Bound, Finding, Pocket, Point, Sheet, Size } from '../spacing'
import type { Ink } from './palette'

export interface Box {
  x: number
  y: number
  width: number
  height: number
}

/** Path data in scene inches. */
export type PathData = string

export interface PathShape {
  kind: 'path'
  d: PathData
  fill?: Ink
  stroke?: Ink
  strokePx?: number
  dashPx?: number[]
  opacity?: number
  /** The shape is cut to the intersection of these areas (nonzero winding). */
  clip?: PathData[]
  cap?: 'round' | 'butt'
}

export type Face = 'text' | 'mono' | 'heading'

export interface TextShape {
  kind: 'text'
  /** Baseline point. */
  x: number
  y: number
  text: string
  sizePx: number
  ink: Ink
  anchor: 'start' | 'middle' | 'end'
  font: Face
  italic?: boolean
  bold?: boolean
  /** A rim in the sheet's colour so that the text stays readable over the drawing. */
  halo?: boolean
}

export const MARKS = ['key', 'cross', 'north', 'dot'] as const
/** key: letter in a ring; cross: a plant's axis; north: arrow turned by `turn`; dot: end of a leader. */
export type MarkName = (typeof MARKS)[number]

export interface MarkShape {
  kind: 'mark'
  mark: MarkName
  x: number
  y: number
  text?: string
  ink: Ink
  radiusPx: number
  /** Degrees clockwise from up, for north. */
  turn?: number
  /** Placements this mark stands for, for tapping. */
  placements?: string[]
}

/** Slanting lines over the intersection of the areas. */
export interface HatchShape {
  kind: 'hatch'
  clip: PathData[]
  /** Holds the hatched area. */
  box: Box
  ink: Ink
  spacingPx: number
}

export type Shape = PathShape | TextShape | MarkShape | HatchShape

export interface PlantDrawing {
  /** Id of the placement. */
  placement: string
  /** Id of the plant. */
  plant: string
  /** Foot of the plant (elevation) or its axis (plan), scene. */
  at: { x: number; y: number }
  /** What answers to a tap, scene. */
  hit: Box
  shapes: Shape[]
  /** Larger is nearer the viewer (elevation) or higher above the ground (plan). */
  depth: number
}

export interface View {
  title: string
  box: Box
  ground: Shape[]
  /** In drawing order. */
  plants: PlantDrawing[]
  limits: Shape[]
  labels: Shape[]
  highlight: Shape[]
}

export interface Show {
  limits?: boolean
  keys?: boolean
  /** Titles, walk names, limit labels, scale bar, north. */
  labels?: boolean
  /** Plants that are to go. */
  goes?: boolean
  /** Wording meant for the studio: titles, and limits with their margins instead of the bare sill and gutter. */
  notes?: boolean
}

export interface SceneOptions {
  sheet: Pick<Sheet, 'site' | 'facade' | 'openings' | 'fixtures' | 'walks' | 'beds' | 'plants' | 'placements' | 'standards'>
  /** Years since planting, or full-grown. */
  year: number | 'mature'
  bound: Bound
  /** 1-12; July when absent. */
  month?: number
  /** Screen pixels per inch at the size it will be seen: label placement reckons with it. */
  pxPerInch?: number
  /** Id of the selected placement. */
  selected?: string | null
  finding?: Finding | null
  /** A point of the plan that is asked about, and the largest crown it holds where that is known. */
  spot?: (Point & { room: Size | null }) | null
  /** Empty circles of the plan, with the annuals they take. */
  pockets?: readonly Pocket[]
  show?: Show
}

export interface Scene {
  /** Both views. */
  box: Box
  pxPerInch: number
  elevation: View
  plan: View
  /** Scene y of a height z in the elevation. */
  elevationY: (z: number) => number
  /** Height z of a scene y in the elevation. */
  heightAt: (sceneY: number) => number
  /** Scene y of a distance y from the base line in the plan. */
  planY: (y: number) => number
  /** Distance from the base line of a scene y in the plan. */
  outAt: (sceneY: number) => number
  /** The line that ties a point in plan to the elevation, scene path data. */
  projection: (x: number, y: number) => PathData
}
