'use client'
import type { Route } from 'next'
import { useRouter } from 'next/navigation'
import { useState, useTransition } from 'react'
import type { ErrorBody } from '@/lib/errors'
import { PLAIN, STRONG } from './parts'

interface Props {
  remove: () => Promise<{ ok: true } | { ok: false; error: ErrorBody['error'] }>
}

/** Takes the plant out of the library, asked twice, since it cannot be undone. */
export function RemovePlant({ remove }: Props) {
  const router = useRouter()
  const [isAsking, setAsking] = useState(false)
  const [message, setMessage] = useState<string | null>(null)
  const [isBusy, start] = useTransition()
  const confirm = () =>
    start(async () => {
      const answer = await remove().catch(() => null)
      if (answer?.ok) {
        router.push('/plants?owner=own' as Route)
        return router.refresh()
      }
      setAsking(false)
      setMessage(answer ? answer.error.message : 'The server could not be reached. The plant is still there.')
    })
  return (
    <div className="flex flex-wrap items-center gap-3">
      {isAsking ? (
        <>
          <span>Take this plant out of your library for good?</span>
          <button type="button" className={STRONG} disabled={isBusy} onClick={confirm}>{isBusy ? 'Removing…' : 'Remove it'}</button>
          <button type="button" className={PLAIN} autoFocus onClick={() => setAsking(false)}>Keep it</button>
        </>
      ) : (
        <button type="button" className={PLAIN} onClick={() => { setMessage(null); setAsking(true) }}>Remove plant</button>
      )}
      <p role="alert" className="text-conflict">{message}</p>
    </div>
  )
}
