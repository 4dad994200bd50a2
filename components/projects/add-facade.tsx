'use client'
import { zodResolver } from '@hookform/resolvers/zod'
import { useState } from 'react'
import { useForm } from 'react-hook-form'
import { Button, Dialog, Notice, TextField } from '@/components/ui'
import { EMPTY_FACADE, facadeFormSchema, type FacadeFormValues, type FacadeInput } from '@/lib/project'

/** What adding answered: problems by field, or a sentence about the whole. */
export interface AddState {
  error: string | null
  fields: Partial<Record<keyof FacadeInput, string>>
}

interface Props {
  add: (facade: FacadeInput) => Promise<AddState>
  isFirst: boolean
}

const AWAY = 'The server could not be reached. What you typed is still here: try again.'

/** Adds a house front by its name, its width and the height of its gutter; all of it is measured next. */
export function AddFacade({ add, isFirst }: Props) {
  const [isOpen, setOpen] = useState(false)
  const form = useForm<FacadeFormValues, unknown, FacadeInput>({ resolver: zodResolver(facadeFormSchema), defaultValues: EMPTY_FACADE, mode: 'onTouched' })
  const { register, setError, formState: { errors, isSubmitting } } = form
  const onValid = async (facade: FacadeInput) => {
    const { error, fields } = await add(facade).catch((): AddState => ({ error: AWAY, fields: {} }))
    const faults = Object.entries(fields) as [keyof FacadeInput, string][]
    faults.forEach(([name, message], i) => setError(name, { message }, { shouldFocus: i === 0 }))
    if (error && faults.length === 0) return setError('root', { message: error })
    if (error) return
    form.reset()
    setOpen(false)
  }
  return (
    <Dialog
      title="Add a facade" description="One measured side of the house. Rough figures will do: all of it can be measured next."
      open={isOpen} onOpenChange={setOpen} trigger={<Button variant={isFirst ? 'primary' : 'secondary'}>Add a facade</Button>}
    >
      <form noValidate onSubmit={form.handleSubmit(onValid)} className="grid gap-4">
        {errors.root?.message && <Notice tone="error">{errors.root.message}</Notice>}
        <TextField {...register('name')} label="Name" hint="Such as Street front, or South side." error={errors.name?.message} maxLength={80} autoComplete="off" />
        <div className="grid gap-4 sm:grid-cols-2">
          <TextField {...register('width')} label="Width of the wall" hint="Corner to corner: 32' 6&quot;, 390 in or 9.9 m" error={errors.width?.message} autoComplete="off" />
          <TextField {...register('gutter')} label="Height of the gutter" hint="Above the soil at the left corner" error={errors.gutter?.message} autoComplete="off" />
        </div>
        <Button type="submit" variant="primary" aria-disabled={isSubmitting} className="justify-self-start">{isSubmitting ? 'Adding' : 'Add the facade'}</Button>
      </form>
    </Dialog>
  )
}
