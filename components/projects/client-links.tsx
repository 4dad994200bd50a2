'use client'
import { useState, useSyncExternalStore, useTransition } from 'react'
import { toast } from 'sonner'
import { Button, Dialog, Notice, TextField, When } from '@/components/ui'
import type { SmallState } from './small-action'

interface Link {
  id: string
  createdAt: number
  expiresAt: number
  createdBy: string
}

interface Props {
  /** Links that still open the project, the newest first. */
  links: readonly Link[]
  create: () => Promise<SmallState>
  revoke: (linkId: string) => Promise<SmallState>
}

const AWAY: SmallState = { error: 'The server could not be reached. Nothing was changed: try again.', made: null }
const never = () => () => {}
/** Where this site stands, known only in the browser. */
const useOrigin = () => useSyncExternalStore(never, () => window.location.origin, () => '')

async function copy(address: string) {
  try {
    await navigator.clipboard.writeText(address)
    toast('The link is copied.')
  } catch {
    toast('The browser would not copy it. Select the link and copy it by hand.')
  }
}

function NewLink({ path }: { path: string }) {
  const address = `${useOrigin()}${path}`
  return (
    <Notice tone="good" title="The link is made. It is shown only now: send it to the client.">
      <div className="mt-2 flex flex-wrap items-end gap-3">
        <TextField label="Link for the client" value={address} readOnly onFocus={(event) => event.target.select()} className="min-w-0 flex-[1_1_16rem]" />
        <Button onClick={() => void copy(address)}>Copy it</Button>
      </div>
    </Notice>
  )
}

function OneLink({ link, revoke, onRevoked }: { link: Link; revoke: Props['revoke']; onRevoked: () => void }) {
  const [isOpen, setOpen] = useState(false)
  const [error, setError] = useState<string | null>(null)
  const [isBusy, start] = useTransition()
  const confirm = () => {
    if (isBusy) return
    start(async () => {
      const answer = await revoke(link.id).catch(() => AWAY)
      setError(answer.error)
      if (!answer.error) onRevoked()
    })
  }
  return (
    <li className="flex flex-wrap items-center justify-between gap-x-4 border-t border-rule py-1">
      <span>Made <When at={link.createdAt} /> by {link.createdBy}, opens until <When at={link.expiresAt} to="day" /></span>
      <Dialog
        title="Revoke this link?" description="It opens nothing from then on, and the client is signed out. You can make another." open={isOpen} onOpenChange={setOpen}
        trigger={<Button variant="quiet" className="-mx-4">Revoke<span className="sr-only"> the link made by {link.createdBy}</span></Button>}
      >
        <div className="grid gap-4">
          {error && <Notice tone="error">{error}</Notice>}
          <div className="flex flex-wrap gap-3">
            <Button variant="danger" aria-disabled={isBusy} onClick={confirm}>{isBusy ? 'Revoking' : 'Revoke it'}</Button>
            <Button onClick={() => setOpen(false)}>Keep it</Button>
          </div>
        </div>
      </Dialog>
    </li>
  )
}

/** The client's way in: a new link is shown once, live ones can be revoked. */
export function ClientLinks({ links, create, revoke }: Props) {
  const [state, setState] = useState<SmallState>({ error: null, made: null })
  const [isBusy, start] = useTransition()
  const make = () => {
    if (!isBusy) start(async () => setState(await create().catch(() => AWAY)))
  }
  const onRevoked = () => {
    setState({ error: null, made: null })
    toast('The link is revoked.')
  }
  return (
    <section aria-labelledby="client-links" className="grid grid-cols-1 gap-4">
      <div className="flex flex-wrap items-center justify-between gap-3">
        <h2 id="client-links" className="font-heading text-2xl">For the client</h2>
        <Button aria-disabled={isBusy} onClick={make}>{isBusy ? 'Making the link' : 'Make a link'}</Button>
      </div>
      <div className="grid grid-cols-1 gap-4 border border-rule bg-sheet p-4">
        <p className="max-w-prose">A link opens the drawings of this project without findings, notes or other projects. Whoever has it can look; it needs no password.</p>
        {state.error && <Notice tone="error">{state.error}</Notice>}
        {state.made && <NewLink path={state.made} />}
        {links.length > 0 && <ul>{links.map((link) => <OneLink key={link.id} link={link} revoke={revoke} onRevoked={onRevoked} />)}</ul>}
      </div>
    </section>
  )
}
