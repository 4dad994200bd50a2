/** How saving stands, in words. */
import type { SaveState } from './save-queue'

const clock = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit' })

const edits = (count: number) => (count === 1 ? '1 edit' : `${count} edits`)

/**
 * What the page says about saving. "Saved" stands alone only when the server has acknowledged every edit.
 * @example saveLabel({ phase: { kind: 'waiting', message: '' }, waiting: 3, isLasting: true, refusals: [] }) // 'On this device only: 3 edits waiting'
 */
export function saveLabel({ phase, waiting, isLasting }: SaveState): string {
  const place = isLasting ? 'On this device only' : 'On this page only'
  switch (phase.kind) {
    case 'saved':
      if (waiting > 0) return 'Saving'
      return phase.at === null ? 'Nothing changed yet' : `Saved ${clock.format(phase.at)}`
    case 'saving':
      return 'Saving'
    case 'waiting':
      return `${place}: ${edits(waiting)} waiting`
    case 'signed-out':
      return `Signed out. ${place}: ${edits(waiting)} waiting`
    case 'conflict':
      return `Not saved: someone else changed the same ${phase.clashes.length === 1 ? 'thing' : 'things'}`
    case 'refused':
      return 'Something was refused; the rest is saved'
    case 'stopped':
      return `Not saved, ${edits(waiting)} waiting`
  }
}
