'use client'
import type { Route } from 'next'
import { useRouter } from 'next/navigation'
import { useState, useTransition } from 'react'
import { Button } from '@/components/ui'
import type { ErrorBody } from '@/lib/errors'

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
          <Button variant="danger" disabled={isBusy} onClick={confirm}>{isBusy ? 'Removing…' : 'Remove it'}</Button>
          <Button autoFocus onClick={() => setAsking(false)}>Keep it</Button>
        </>
      ) : (
        <Button onClick={() => { setMessage(null); setAsking(true) }}>Remove plant</Button>
      )}
      <p role="alert" className="text-conflict">{message}</p>
    </div>
  )
}
