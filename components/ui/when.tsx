'use client'
import { useSyncExternalStore } from 'react'

const FORMS = {
  day: { dateStyle: 'medium' },
  minute: { dateStyle: 'medium', timeStyle: 'short', hourCycle: 'h23' },
} as const satisfies Record<string, Intl.DateTimeFormatOptions>

const stay = () => () => {}

interface WhenProps {
  /** Instant, ms UTC. */
  at: number
  to?: keyof typeof FORMS
}

/** An instant in the reader's own time zone; in UTC until the page's scripts have come. */
export function When({ at, to = 'day' }: WhenProps) {
  const zone = useSyncExternalStore(stay, () => Intl.DateTimeFormat().resolvedOptions().timeZone, () => 'UTC')
  const text = new Intl.DateTimeFormat('en-US', { ...FORMS[to], timeZone: zone }).format(at)
  return <time dateTime={new Date(at).toISOString()}>{text}</time>
}
