'use client'
import { useActionState, useState } from 'react'
import { FindingCounts } from '@/components/findings/finding-counts'
import { Button, Dialog, LinkButton, Notice, TextField, When } from '@/components/ui'
import type { FindingKind } from '@/lib/spacing'
import { UNTRIED, type SmallAction, type SmallState } from './small-action'

interface Facade {
  id: string
  name: string
  placements: number
  counts: Record<FindingKind, number>
  updatedAt: number
}

export interface FacadeActions {
  rename: (facadeId: string, before: SmallState, form: FormData) => Promise<SmallState>
  remove: (facadeId: string) => Promise<SmallState>
  add: SmallAction
}

/** What this role may do with a facade. */
export interface FacadeWays {
  look: boolean
  draw: boolean
  list: boolean
  /** Add, rename and remove. */
  edit: boolean
}

interface Props {
  projectId: string
  facades: readonly Facade[]
  may: FacadeWays
  actions: FacadeActions
}

function Rename({ facade, rename }: { facade: Facade; rename: FacadeActions['rename'] }) {
  const [state, send, isPending] = useActionState(rename.bind(null, facade.id), UNTRIED)
  return (
    <form key={`${facade.name} ${state.typed?.name}`} action={send} className="flex flex-wrap items-end gap-2">
      <TextField name="name" label="Name" defaultValue={state.typed?.name ?? facade.name} required maxLength={80} error={state.fields?.name ?? state.error} />
      <Button type="submit" disabled={isPending}>Rename</Button>
    </form>
  )
}

function Remove({ facade, remove }: { facade: Facade; remove: FacadeActions['remove'] }) {
  const [isOpen, setOpen] = useState(false)
  const [state, send, isPending] = useActionState(() => remove(facade.id), UNTRIED)
  const plants = facade.placements === 0 ? 'Nothing is planted on it' : facade.placements === 1 ? 'Its one plant goes too' : `Its ${facade.placements} plants go too`
  return (
    <>
      <Button variant="danger" onClick={() => setOpen(true)}>Remove {facade.name}</Button>
      <Dialog title={`Remove ${facade.name}?`} description={`Its measures, windows, walks and beds go with it. ${plants}. This cannot be undone.`} open={isOpen} onOpenChange={setOpen}>
        {state.error && <Notice tone="error">{state.error}</Notice>}
        <form action={send} className="mt-4 flex flex-wrap gap-3">
          <Button type="submit" variant="danger" disabled={isPending}>Remove it</Button>
          <Button onClick={() => setOpen(false)}>Keep it</Button>
        </form>
      </Dialog>
    </>
  )
}

function OneFacade({ facade, projectId, may, actions }: { facade: Facade } & Omit<Props, 'facades'>) {
  const path = `/projects/${projectId}/facades/${facade.id}`
  return (
    <li className="grid gap-3 border border-rule bg-sheet p-4">
      <h3 className="font-heading text-xl">{facade.name}</h3>
      <FindingCounts counts={facade.counts} isPlanted={facade.placements > 0} />
      <p className="text-ink-soft">{facade.placements === 0 ? 'No plants' : facade.placements === 1 ? 'One plant' : `${facade.placements} plants`}. Changed <When at={facade.updatedAt} />.</p>
      <div className="flex flex-wrap gap-3">
        {may.look && <LinkButton href={path} variant="primary" aria-label={`${may.draw ? 'Draw' : 'Look at'} ${facade.name}`}>{may.draw ? 'Draw' : 'Look'}</LinkButton>}
        {may.look && <LinkButton href={`${path}/measure`} aria-label={`${may.draw ? 'Measure' : 'Measures of'} ${facade.name}`}>{may.draw ? 'Measure' : 'Measures'}</LinkButton>}
        {may.list && <LinkButton href={`${path}/plant-list`} aria-label={`Plant list of ${facade.name}`}>Plant list</LinkButton>}
      </div>
      {may.edit && (
        <details>
          <summary className="flex min-h-11 cursor-pointer items-center underline decoration-rule underline-offset-4">Rename or remove</summary>
          <div className="flex flex-wrap items-end gap-3 pt-2"><Rename facade={facade} rename={actions.rename} /><Remove facade={facade} remove={actions.remove} /></div>
        </details>
      )}
    </li>
  )
}

function Add({ add }: { add: SmallAction }) {
  const [{ typed = {}, fields = {}, error }, send, isPending] = useActionState(add, UNTRIED)
  const line = (name: string) => ({ name, defaultValue: typed[name] ?? '', error: fields[name], required: true, autoComplete: 'off' })
  return (
    // The key starts the fields anew with what was typed.
    <form key={JSON.stringify(typed)} action={send} className="grid gap-4 border border-dashed border-ink-soft p-4">
      {error && <Notice tone="error">{error}</Notice>}
      <div className="grid items-start gap-4 md:grid-cols-3">
        <TextField label="New facade" hint="Such as front, or garden side" maxLength={80} {...line('name')} />
        <TextField label="Wall from corner to corner" hint={'Such as 40 ft or 38\'-6"'} {...line('width')} />
        <TextField label="Gutter above the soil" hint={'Such as 9 ft or 8\'-10"'} {...line('gutter')} />
      </div>
      <Button type="submit" disabled={isPending} className="justify-self-start">{isPending ? 'Adding' : 'Add the facade'}</Button>
    </form>
  )
}

/** The facades of a project, with the ways into each; editors add, rename and remove them. */
export function FacadeList(props: Props) {
  const { facades, may, actions } = props
  return (
    <section aria-labelledby="facades" className="grid gap-4">
      <h2 id="facades" className="font-heading text-2xl">Facades</h2>
      {facades.length === 0 && <p>A facade is one measured side of the house. {may.edit ? 'Add the first one below.' : 'None is drawn yet.'}</p>}
      <ul className="grid gap-4 lg:grid-cols-2">{facades.map((facade) => <OneFacade key={facade.id} {...props} facade={facade} />)}</ul>
      {may.edit && <Add add={actions.add} />}
    </section>
  )
}
