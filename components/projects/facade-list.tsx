'use client'
import { useActionState, useState } from 'react'
import { FindingCounts } from '@/components/findings/finding-counts'
import { Button, Dialog, LinkButton, Notice, TextField } from '@/components/ui'
import type { FindingKind } from '@/lib/spacing'
import type { SmallAction, SmallState } from './small-action'

interface Facade {
  id: string
  name: string
  placements: number
  counts: Record<FindingKind, number>
}

export interface FacadeActions {
  rename: (facadeId: string, before: SmallState, form: FormData) => Promise<SmallState>
  remove: (facadeId: string) => Promise<SmallState>
  add: SmallAction
}

interface Props {
  projectId: string
  facades: readonly Facade[]
  canEdit: boolean
  actions: FacadeActions
}

const QUIET: SmallState = { error: null, made: null }

function Rename({ facade, rename }: { facade: Facade; rename: FacadeActions['rename'] }) {
  const [state, send, isPending] = useActionState(rename.bind(null, facade.id), QUIET)
  return (
    <form action={send} className="flex flex-wrap items-end gap-2">
      <TextField name="name" label="Name" defaultValue={facade.name} required maxLength={80} error={state.error} />
      <Button type="submit" disabled={isPending}>Rename</Button>
    </form>
  )
}

function Remove({ facade, remove }: { facade: Facade; remove: FacadeActions['remove'] }) {
  const [isOpen, setOpen] = useState(false)
  const [state, send, isPending] = useActionState(() => remove(facade.id), QUIET)
  const what = facade.placements === 1 ? 'its one plant' : `its ${facade.placements} plants`
  return (
    <>
      <Button variant="danger" onClick={() => setOpen(true)}>Remove {facade.name}</Button>
      <Dialog title={`Remove ${facade.name}?`} description={`Its measures and ${what} go with it. This cannot be undone.`} open={isOpen} onOpenChange={setOpen}>
        {state.error && <Notice tone="error">{state.error}</Notice>}
        <form action={send} className="mt-4 flex flex-wrap gap-3">
          <Button type="submit" variant="danger" disabled={isPending}>Remove it</Button>
          <Button onClick={() => setOpen(false)}>Keep it</Button>
        </form>
      </Dialog>
    </>
  )
}

function OneFacade({ facade, projectId, canEdit, actions }: { facade: Facade } & Omit<Props, 'facades'>) {
  const path = `/projects/${projectId}/facades/${facade.id}`
  return (
    <li className="grid gap-3 border border-rule bg-sheet p-4">
      <h3 className="font-heading text-xl">{facade.name}</h3>
      <FindingCounts counts={facade.counts} />
      <p className="text-ink-soft">{facade.placements === 0 ? 'Nothing planted yet' : facade.placements === 1 ? 'One plant' : `${facade.placements} plants`}</p>
      <div className="flex flex-wrap gap-3">
        <LinkButton href={path} variant="primary" aria-label={`Drawing table of ${facade.name}`}>Drawing table</LinkButton>
        <LinkButton href={`${path}/measure`} aria-label={`Measure ${facade.name}`}>Measure</LinkButton>
        <LinkButton href={`${path}/plant-list`} aria-label={`Plant list of ${facade.name}`}>Plant list</LinkButton>
      </div>
      {canEdit && (
        <details>
          <summary className="flex min-h-11 cursor-pointer items-center underline decoration-rule underline-offset-4">Rename or remove</summary>
          <div className="flex flex-wrap items-end gap-3 pt-2"><Rename facade={facade} rename={actions.rename} /><Remove facade={facade} remove={actions.remove} /></div>
        </details>
      )}
    </li>
  )
}

/** The facades of a project, with the ways into each; editors add, rename and remove them. */
export function FacadeList(props: Props) {
  const [state, send, isPending] = useActionState(props.actions.add, QUIET)
  return (
    <section aria-labelledby="facades" className="grid gap-4">
      <h2 id="facades" className="font-heading text-2xl">Facades</h2>
      {props.facades.length === 0 && <p>A facade is one measured side of the house. {props.canEdit ? 'Add the first one below.' : 'None is drawn yet.'}</p>}
      <ul className="grid gap-4 lg:grid-cols-2">{props.facades.map((facade) => <OneFacade key={facade.id} {...props} facade={facade} />)}</ul>
      {props.canEdit && (
        <form action={send} className="flex flex-wrap items-end gap-3 border border-dashed border-ink-soft p-4">
          <TextField name="name" label="New facade" placeholder="Front" required maxLength={80} />
          <TextField name="width" label="Wall from corner to corner" placeholder="40 ft" required error={state.error} />
          <Button type="submit" disabled={isPending}>Add the facade</Button>
        </form>
      )}
    </section>
  )
}
