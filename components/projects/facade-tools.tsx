'use client'
/** What editors do to a facade from outside: rename it, remove it. */
import { useState, useTransition } from 'react'
import { toast } from 'sonner'
import { Button, Dialog, Notice, TextField } from '@/components/ui'
import type { SmallState } from './small-action'

interface Facade {
  id: string
  name: string
  placements: number
}

interface Props {
  facade: Facade
  rename: (facadeId: string, name: string) => Promise<SmallState>
  remove: (facadeId: string) => Promise<SmallState>
}

const AWAY = 'The server could not be reached. Nothing was changed: try again.'

/** Runs a small action and keeps what it said. */
function useDeed(work: () => Promise<SmallState>, onDone: () => void) {
  const [error, setError] = useState<string | null>(null)
  const [isBusy, start] = useTransition()
  const run = () => {
    if (isBusy) return
    start(async () => {
      const answer = await work().catch(() => ({ error: AWAY }))
      setError(answer.error)
      if (!answer.error) onDone()
    })
  }
  return { error, isBusy, run }
}

function Rename({ facade, rename }: Omit<Props, 'remove'>) {
  const [isOpen, setOpen] = useState(false)
  const [name, setName] = useState(facade.name)
  const { error, isBusy, run } = useDeed(() => rename(facade.id, name), () => setOpen(false))
  const open = (wanted: boolean) => {
    if (wanted) setName(facade.name)
    setOpen(wanted)
  }
  return (
    <Dialog title={`Rename ${facade.name}`} open={isOpen} onOpenChange={open} trigger={<Button variant="quiet" className="-ml-4" aria-label={`Rename ${facade.name}`}>Rename</Button>}>
      <form className="grid gap-4" onSubmit={(event) => { event.preventDefault(); run() }}>
        <TextField label="Name" value={name} onChange={(event) => setName(event.target.value)} maxLength={80} error={error} autoComplete="off" />
        <Button type="submit" variant="primary" aria-disabled={isBusy} className="justify-self-start">{isBusy ? 'Renaming' : 'Rename'}</Button>
      </form>
    </Dialog>
  )
}

const withWhat = (count: number) => (count === 0 ? 'Its measures go with it.' : `Its measures and its ${count === 1 ? 'one plant' : `${count} plants`} go with it.`)

function Remove({ facade, remove }: Omit<Props, 'rename'>) {
  const [isOpen, setOpen] = useState(false)
  const { error, isBusy, run } = useDeed(() => remove(facade.id), () => toast(`${facade.name} is removed.`))
  return (
    <Dialog
      title={`Remove ${facade.name}?`} description={`${withWhat(facade.placements)} This cannot be undone.`} open={isOpen} onOpenChange={setOpen}
      trigger={<Button variant="quiet" aria-label={`Remove ${facade.name}`}>Remove</Button>}
    >
      <div className="grid gap-4">
        {error && <Notice tone="error">{error}</Notice>}
        <div className="flex flex-wrap gap-3">
          <Button variant="danger" aria-disabled={isBusy} onClick={run}>{isBusy ? 'Removing' : 'Remove it'}</Button>
          <Button onClick={() => setOpen(false)}>Keep it</Button>
        </div>
      </div>
    </Dialog>
  )
}

/** See the file's head. */
export function FacadeTools({ facade, rename, remove }: Props) {
  return (
    <>
      <Rename facade={facade} rename={rename} />
      <Remove facade={facade} remove={remove} />
    </>
  )
}
