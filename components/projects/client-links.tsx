'use client'
import { useActionState, useState, useSyncExternalStore } from 'react'
import { toast } from 'sonner'
import { Button, Dialog, Notice, TextField, When } from '@/components/ui'
import { UNTRIED, type SmallState } from './small-action'

interface Link {
  id: string
  createdAt: number
  expiresAt: number
  createdBy: string
}

interface Props {
  links: readonly Link[]
  /** How long a new link opens the garden. */
  days: number
  create: () => Promise<SmallState>
  revoke: (linkId: string) => Promise<SmallState>
}

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

function OneLink({ link, revoke }: { link: Link; revoke: Props['revoke'] }) {
  const [isOpen, setOpen] = useState(false)
  const [state, send, isPending] = useActionState(() => revoke(link.id), UNTRIED)
  return (
    <li className="flex flex-wrap items-center justify-between gap-3 border-t border-rule py-2">
      <span>Made <When at={link.createdAt} to="minute" /> by {link.createdBy}, opens until <When at={link.expiresAt} /></span>
      <Button variant="danger" onClick={() => setOpen(true)} aria-label={`Revoke the link made by ${link.createdBy}`}>Revoke</Button>
      <Dialog title="Revoke this link?" description="Whoever holds it is shut out at once. It cannot be brought back; a new link can be made at any time." open={isOpen} onOpenChange={setOpen}>
        {state.error && <Notice tone="error">{state.error}</Notice>}
        <form action={send} className="mt-4 flex flex-wrap gap-3">
          <Button type="submit" variant="danger" disabled={isPending}>Revoke it</Button>
          <Button onClick={() => setOpen(false)}>Keep it</Button>
        </form>
      </Dialog>
    </li>
  )
}

/** The client's way in: a new link is shown once, live ones can be revoked. */
export function ClientLinks({ links, days, create, revoke }: Props) {
  const [state, send, isPending] = useActionState(create, UNTRIED)
  const origin = useOrigin()
  // A link that was revoked meanwhile is not worth copying.
  const address = state.made && links.some(({ id }) => id === state.id) ? `${origin}${state.made}` : null
  return (
    <section aria-labelledby="client-links" className="grid gap-3 border border-rule bg-sheet p-4">
      <h2 id="client-links" className="font-heading text-2xl">For the client</h2>
      <p>A link opens the drawing of this project, without findings, notes or other projects. Whoever has it can look, for {days} days or until it is revoked.</p>
      {state.error && <Notice tone="error">{state.error}</Notice>}
      {address && (
        <div className="flex flex-wrap items-end gap-3">
          <TextField label="The new link" hint={`Shown this once. It opens for ${days} days, as often as wanted.`} value={address} readOnly className="min-w-64 flex-1" onFocus={(event) => event.target.select()} />
          <Button onClick={() => void copy(address)} className="mb-7">Copy it</Button>
        </div>
      )}
      <form action={send}><Button type="submit" disabled={isPending}>Make a client link</Button></form>
      {links.length > 0 && <ul>{links.map((link) => <OneLink key={link.id} link={link} revoke={revoke} />)}</ul>}
    </section>
  )
}
