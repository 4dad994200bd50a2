'use client'
import { useDeferredValue, useEffect, useMemo, useRef, useState } from 'react'
import { SceneSvg } from '@/components/drawing/scene-svg'
import { buildScene } from '@/lib/drawing'
import type { Sheet } from '@/lib/spacing'
import { useMeasure } from './measure-context'

/** Screen pixels an inch gets when a scene is fitted into this room. */
const fit = ({ box }: { box: { width: number; height: number } }, room: Room) => Math.min(room.width / box.width, room.height / box.height)

interface Room {
  width: number
  height: number
}

function sceneFor(sheet: Sheet, room: Room) {
  const build = (pxPerInch: number) => buildScene({ sheet, year: 0, bound: 'expected', pxPerInch, show: { limits: true, keys: false, labels: true } })
  // Labels take room of their own: the second scene knows the scale the first one came to.
  return build(fit(build(1), room))
}

/** Room the drawing has: the width of its column, and what is left of the window below the bar. */
function useRoom() {
  const frame = useRef<HTMLDivElement>(null)
  const [room, setRoom] = useState<Room>({ width: 540, height: 640 })
  useEffect(() => {
    const element = frame.current
    if (!element) return
    const look = () => setRoom({ width: Math.max(240, element.clientWidth), height: Math.max(240, window.innerHeight - 140) })
    const observer = new ResizeObserver(look)
    observer.observe(element)
    window.addEventListener('resize', look)
    return () => {
      observer.disconnect()
      window.removeEventListener('resize', look)
    }
  }, [])
  return { frame, room }
}

/** The sheet as it is typed, elevation above plan, with the plants as they are planted. */
export function MeasureDrawing({ label }: { label: string }) {
  const { state } = useMeasure()
  const { frame, room } = useRoom()
  const sheet = useDeferredValue(state.shown)
  const scene = useMemo(() => sceneFor(sheet, room), [sheet, room])
  return (
    <div ref={frame}>
      <SceneSvg scene={scene} view="both" label={label} />
    </div>
  )
}
