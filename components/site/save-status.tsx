'use client'
import { saveLabel } from '../drawing-table/editor/save-label'
import type { SaveState } from '../drawing-table/editor/save-queue'
import { ActionButton } from './parts'

interface Props {
  state: SaveState
  /** Things that are typed and cannot be kept yet. */
  waitingThings: number
  onRetry: () => void
  onDismiss: () => void
}

const reasonOf = ({ phase, refusals }: SaveState): string | null =>
  phase.kind === 'waiting' || phase.kind === 'stopped' ? phase.message : phase.kind === 'refused' ? refusals.join(' ') : null

/** How saving stands, always in sight: saved and when, saving, or not saved and why. */
export function SaveStatus({ state, waitingThings, onRetry, onDismiss }: Props) {
  const { kind } = state.phase
  const reason = reasonOf(state)
  return (
    <div className="flex flex-wrap items-center gap-2">
      <p role="status">
        {saveLabel(state)}
        {reason ? `. ${reason}` : null}
        {waitingThings > 0 ? <span className="text-conflict"> {waitingThings === 1 ? 'One thing is' : `${waitingThings} things are`} not kept: see the marked fields.</span> : null}
      </p>
      {kind === 'waiting' || kind === 'stopped' || kind === 'signed-out' ? <ActionButton kind="plain" onPress={onRetry}>Try again</ActionButton> : null}
      {kind === 'refused' ? <ActionButton kind="plain" onPress={onDismiss}>I have read it</ActionButton> : null}
    </div>
  )
}
