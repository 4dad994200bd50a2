'use client'
/** The desk of this page, for the panels around the drawing. */
import { createContext, use, useMemo, useSyncExternalStore } from 'react'
import type { CommandContext, Desk, EditorState, SaveState, Surroundings } from './editor'

const DeskContext = createContext<CommandContext | null>(null)

export function DeskProvider({ desk, page, children }: { desk: Desk; page: Surroundings; children: React.ReactNode }) {
  const value = useMemo(() => ({ ...desk, page }), [desk, page])
  return <DeskContext value={value}>{children}</DeskContext>
}

export function useDesk(): CommandContext {
  const desk = use(DeskContext)
  if (!desk) throw new Error('useDesk is for parts of the drawing table.')
  return desk
}

/** What the editor shows now. Not told of the frames of a drag. */
export function useEditorState(): EditorState {
  const { editor } = useDesk()
  return useSyncExternalStore(editor.subscribe, editor.getSnapshot, editor.getSnapshot)
}

export function useSaveState(): SaveState {
  const { queue } = useDesk()
  return useSyncExternalStore(queue.subscribe, queue.getSnapshot, queue.getSnapshot)
}
