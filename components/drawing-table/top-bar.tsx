'use client'
/** Where one is, how saving stands, and the way back. */
import type { Route } from 'next'
import Link from 'next/link'
import { saveLabel } from './editor'
import { useDesk, useEditorState, useSaveState } from './desk-context'
import { RedoIcon, UndoIcon } from './icons'
import { CommandButton, PLAIN, QUIET } from './parts'
import type { TableFacade } from './types'

function SaveLine() {
  const { queue } = useDesk()
  const state = useSaveState()
  const { kind } = state.phase
  const isStuck = kind === 'waiting' || kind === 'signed-out' || kind === 'stopped'
  const reason = state.phase.kind === 'waiting' || state.phase.kind === 'stopped' ? ` ${state.phase.message}` : ''
  return (
    <div className="flex items-center gap-2">
      <p role="status" data-testid="save-state" data-phase={kind} className={isStuck || kind === 'conflict' || kind === 'refused' ? 'text-conflict' : 'text-ink-soft'}>
        {saveLabel(state)}
        {reason ? <span className="hidden xl:inline">. {reason.trim()}</span> : null}
      </p>
      {kind === 'signed-out' ? <a href="/sign-in" target="_blank" rel="noreferrer" className={QUIET}>Sign in</a> : null}
      {isStuck ? <button type="button" className={PLAIN} onClick={queue.wake}>Send now</button> : null}
    </div>
  )
}

export function TopBar({ facade, canListPlants }: { facade: TableFacade; canListPlants: boolean }) {
  const { editor } = useDesk()
  const { undoLabel, redoLabel } = useEditorState()
  const home = `/projects/${facade.projectId}`
  const here = `${home}/facades/${facade.id}`
  return (
    <div className="flex min-h-15 flex-wrap items-center gap-x-3 gap-y-1 border-b border-rule px-4 py-1.5">
      <nav aria-label="Where you are" className="mr-auto flex min-w-0 items-center">
        <Link href={home as Route} className={`${QUIET} -ml-3`}>{facade.projectName}</Link>
        <span aria-hidden="true" className="text-ink-soft">/</span>
        <h1 className="truncate px-3 font-heading text-xl">{facade.name}</h1>
      </nav>
      {editor.canEdit ? <SaveLine /> : <p className="text-ink-soft">You may look; owners and designers plant.</p>}
      {editor.canEdit ? (
        <div className="flex gap-2">
          <CommandButton id="undo" label={undoLabel ? `Undo: ${undoLabel}` : 'Undo: nothing yet'}><UndoIcon /></CommandButton>
          <CommandButton id="redo" label={redoLabel ? `Redo: ${redoLabel}` : 'Redo: nothing yet'}><RedoIcon /></CommandButton>
        </div>
      ) : null}
      <div className="flex">
        <Link href={`${here}/measure` as Route} className={QUIET}>Measure</Link>
        {canListPlants ? <Link href={`${here}/plant-list` as Route} className={QUIET}>Plant list</Link> : null}
      </div>
    </div>
  )
}
