'use client'
/** Keys of the page, from the one list of commands. */
import { useEffect } from 'react'
import { commandFor, isArrow } from './editor'
import { useDesk } from './desk-context'

const isField = (target: EventTarget | null) =>
  target instanceof HTMLTextAreaElement || target instanceof HTMLSelectElement || (target instanceof HTMLInputElement && target.type !== 'range' && target.type !== 'radio')

/** Hears keys anywhere on the page; those that are not global only inside the drawing. */
export function useKeys(drawing: React.RefObject<HTMLElement | null>): void {
  const desk = useDesk()
  useEffect(() => {
    const press = (event: KeyboardEvent) => {
      if (event.defaultPrevented || isField(event.target)) return
      const onDrawing = event.target === drawing.current
      const command = commandFor(event, { onDrawing })
      if (!command?.when(desk)) return
      event.preventDefault()
      command.run(desk)
    }
    // An arrow let go ends the move it began: one gesture, however long it was held.
    const release = (event: KeyboardEvent) => {
      if (isArrow(event.key) && desk.editor.moving && !desk.editor.getSnapshot().isCarried) desk.editor.commitMove()
    }
    const leave = () => {
      if (desk.editor.moving && !desk.editor.getSnapshot().isCarried) desk.editor.commitMove()
    }
    const element = drawing.current
    window.addEventListener('keydown', press)
    window.addEventListener('keyup', release)
    element?.addEventListener('blur', leave)
    return () => {
      window.removeEventListener('keydown', press)
      window.removeEventListener('keyup', release)
      element?.removeEventListener('blur', leave)
    }
  }, [desk, drawing])
}
