import type { Box, HatchShape, MarkShape, PlantDrawing, Scene, Shape, TextShape, View } from '@/lib/drawing'

/** A colour token as CSS: the theme decides the colour. */
const colour = (ink: string) => `var(--color-${ink})`

const FACES: Record<TextShape['font'], string> = {
  text: 'var(--font-text, sans-serif)',
  mono: 'var(--font-mono, monospace)',
  heading: 'var(--font-heading, serif)',
}

interface Pen {
  /** Starts every id of this drawing, so that several can stand on one page. */
  name: string
  /** Inches of one screen pixel at the size drawn for. */
  inch: number
}

/** The intersection of several areas: each clip is itself clipped by the next. */
function Clips({ id, clip }: { id: string; clip: readonly string[] }) {
  return clip.map((d, i) => (
    <clipPath key={i} id={`${id}-${i}`} clipPath={i > 0 ? `url(#${id}-${i - 1})` : undefined}>
      <path d={d} />
    </clipPath>
  ))
}

const lastClip = (id: string, clip: readonly string[]) => `url(#${id}-${clip.length - 1})`

function Words({ shape, inch }: { shape: TextShape; inch: number }) {
  return (
    <text
      x={shape.x}
      y={shape.y}
      fontSize={shape.sizePx * inch}
      textAnchor={shape.anchor}
      fill={colour(shape.ink)}
      fontStyle={shape.italic ? 'italic' : undefined}
      fontWeight={shape.bold ? 700 : undefined}
      fontFamily={FACES[shape.font]}
      {...(shape.halo && { stroke: colour('sheet'), strokeWidth: 3.5 * inch, strokeLinejoin: 'round' as const, paintOrder: 'stroke' })}
    >
      {shape.text}
    </text>
  )
}

function Mark({ shape, inch }: { shape: MarkShape; inch: number }) {
  const { x, y, ink, radiusPx, text = '' } = shape
  const r = radiusPx * inch
  const line = { stroke: colour(ink), vectorEffect: 'non-scaling-stroke' as const, fill: 'none' }
  switch (shape.mark) {
    case 'dot':
      return <circle cx={x} cy={y} r={r} fill={colour(ink)} />
    case 'cross':
      return <path d={`M${x - r} ${y}H${x + r}M${x} ${y - r}V${y + r}`} {...line} strokeWidth={1.2} />
    case 'key':
      return (
        <g>
          <circle cx={x} cy={y} r={r} {...line} fill={colour('sheet')} strokeWidth={1.3} />
          <text x={x} y={y + 4.3 * inch} fontSize={12.5 * inch} fontWeight={700} textAnchor="middle" fill={colour(ink)} fontFamily={FACES.text}>{text}</text>
        </g>
      )
    case 'north':
      return (
        <g>
          <g transform={`rotate(${shape.turn ?? 0} ${x} ${y})`}>
            <path d={`M${x} ${y - r}L${x + r * 0.42} ${y + r * 0.7}L${x} ${y + r * 0.38}Z`} {...line} strokeWidth={1} fill={colour(ink)} />
            <path d={`M${x} ${y - r}L${x - r * 0.42} ${y + r * 0.7}L${x} ${y + r * 0.38}Z`} {...line} strokeWidth={1} fill={colour('sheet')} />
          </g>
          <text {...northLetter(shape, r, inch)} fontSize={12 * inch} fontWeight={700} textAnchor="middle" fill={colour(ink)} fontFamily={FACES.mono}>{text}</text>
        </g>
      )
  }
}

/** The N stands beyond the arrow's tip. */
function northLetter({ x, y, turn = 0 }: MarkShape, r: number, inch: number) {
  const angle = ((turn - 90) * Math.PI) / 180
  const far = r + 8 * inch
  return { x: x + Math.cos(angle) * far, y: y + Math.sin(angle) * far + 4 * inch }
}

function Hatch({ shape, id, inch }: { shape: HatchShape; id: string; inch: number }) {
  const step = shape.spacingPx * inch
  const { x, y, width, height } = shape.box
  return (
    <>
      <Clips id={id} clip={shape.clip} />
      <pattern id={`${id}-lines`} width={step} height={step} patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
        <path d={`M0 0V${step}`} stroke={colour(shape.ink)} strokeWidth={2.6 * inch} fill="none" />
      </pattern>
      <g clipPath={lastClip(id, shape.clip)}>
        <rect x={x} y={y} width={width} height={height} fill={colour('sheet')} fillOpacity={0.4} />
        <rect x={x} y={y} width={width} height={height} fill={`url(#${id}-lines)`} />
      </g>
    </>
  )
}

function OneShape({ shape, id, inch }: { shape: Shape; id: string; inch: number }) {
  if (shape.kind === 'text') return <Words shape={shape} inch={inch} />
  if (shape.kind === 'mark') return <Mark shape={shape} inch={inch} />
  if (shape.kind === 'hatch') return <Hatch shape={shape} id={id} inch={inch} />
  const drawn = (
    <path
      d={shape.d}
      fill={shape.fill ? colour(shape.fill) : 'none'}
      opacity={shape.opacity}
      {...(shape.stroke && {
        stroke: colour(shape.stroke),
        strokeWidth: shape.strokePx ?? 1,
        strokeDasharray: shape.dashPx?.join(' '),
        strokeLinecap: shape.cap,
        strokeLinejoin: 'round' as const,
        vectorEffect: 'non-scaling-stroke' as const,
      })}
      clipPath={shape.clip ? lastClip(id, shape.clip) : undefined}
    />
  )
  return shape.clip ? <><Clips id={id} clip={shape.clip} />{drawn}</> : drawn
}

function Shapes({ shapes, pen, part }: { shapes: readonly Shape[]; pen: Pen; part: string }) {
  return shapes.map((shape, i) => <OneShape key={i} shape={shape} id={`${pen.name}-${part}${i}`} inch={pen.inch} />)
}

/** One plant of a scene. */
export function PlantShapes({ drawing, pen, part }: { drawing: PlantDrawing; pen: Pen; part: string }) {
  return <g data-placement={drawing.placement}><Shapes shapes={drawing.shapes} pen={pen} part={part} /></g>
}

function OneView({ view, pen, part }: { view: View; pen: Pen; part: string }) {
  return (
    <g data-view={part}>
      <Shapes shapes={view.ground} pen={pen} part={`${part}g`} />
      {view.plants.map((drawing, i) => <PlantShapes key={drawing.placement} drawing={drawing} pen={pen} part={`${part}p${i}-`} />)}
      <Shapes shapes={view.limits} pen={pen} part={`${part}l`} />
      <Shapes shapes={view.highlight} pen={pen} part={`${part}h`} />
      <Shapes shapes={view.labels} pen={pen} part={`${part}t`} />
    </g>
  )
}

export interface SceneSvgProps {
  scene: Scene
  view?: 'both' | 'elevation' | 'plan'
  /** What the drawing shows, in a sentence: read aloud instead of the lines. */
  label: string
  /** What is to be seen on it, for those who cannot. */
  description?: string
  /** Unique on its page; letters, digits and hyphens. */
  name?: string
  /** Part of the scene to show, scene inches; the whole view when absent. */
  window?: Box
  className?: string
}

/** A scene as SVG: drawn on the server or in the browser, without hooks. Takes the width it is given. */
export function SceneSvg({ scene, view = 'both', label, description, name = 'scene', window, className }: SceneSvgProps) {
  const frame = window ?? (view === 'both' ? scene.box : scene[view].box)
  const pen: Pen = { name, inch: 1 / scene.pxPerInch }
  return (
    <svg
      viewBox={`${frame.x} ${frame.y} ${frame.width} ${frame.height}`}
      role="img"
      aria-labelledby={description ? `${name}-title ${name}-desc` : `${name}-title`}
      className={className}
      width="100%"
      xmlns="http://www.w3.org/2000/svg"
    >
      <title id={`${name}-title`}>{label}</title>
      {description && <desc id={`${name}-desc`}>{description}</desc>}
      {view !== 'plan' && <OneView view={scene.elevation} pen={pen} part="e" />}
      {view !== 'elevation' && <OneView view={scene.plan} pen={pen} part="p" />}
    </svg>
  )
}
