'use client'
import { ActionButton } from './parts'
import type { SaveState } from './saver'

const clock = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit' })

/** How saving stands, always in sight: saved and when, saving, or not saved and why. */
export function SaveStatus({ state, waitingFields, onRetry }: { state: SaveState; waitingFields: number; onRetry: () => void }) {
  return (
    <div className="flex flex-wrap items-center gap-2">
      <p role="status" aria-live="polite">
        {sentence(state)}
        {waitingFields > 0 ? <span className="text-conflict"> {waitingFields === 1 ? 'One thing waits' : `${waitingFields} things wait`} for a field to be put right.</span> : null}
      </p>
      {state.kind === 'not-saved' ? <ActionButton kind="plain" onPress={onRetry}>Try again</ActionButton> : null}
    </div>
  )
}

function sentence(state: SaveState): string {
  switch (state.kind) {
    case 'saved':
      return state.at === null ? 'All saved' : `Saved ${clock.format(state.at)}`
    case 'saving':
      return 'Saving'
    case 'not-saved':
      return `Not saved: ${state.message}`
    case 'clash':
      return 'Not saved: someone else changed the same thing.'
  }
}
