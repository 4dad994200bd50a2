'use client'
/** The canvas itself. Loaded in the browser only; what it shows stands also in the Plants table. */
import { useEffect, useRef } from 'react'
import type { Desk } from '../editor'
import { Board } from './board'
import { Pointers } from './pointers'

/** Fills its parent. Draws and listens by itself: it renders once. */
export default function DrawingCanvas({ desk }: { desk: Desk }) {
  const container = useRef<HTMLDivElement>(null)
  useEffect(() => {
    const element = container.current
    if (!element) return
    const board = new Board(element, desk)
    const pointers = new Pointers(element, desk, () => board.current)
    return () => {
      pointers.destroy()
      board.destroy()
    }
  }, [desk])
  return <div ref={container} className="absolute inset-0 touch-none select-none" />
}
