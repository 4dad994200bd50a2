'use client'
/** Adds or changes a plant of the studio. Nothing typed is lost when something does not fit or the server is away. */
import { zodResolver } from '@hookform/resolvers/zod'
import type { Route } from 'next'
import { useRouter } from 'next/navigation'
import { useEffect, useState } from 'react'
import { FormProvider, useForm, type FieldPath, type SubmitErrorHandler, type UseFormReturn } from 'react-hook-form'
import { Button, LinkButton } from '@/components/ui'
import type { ErrorBody } from '@/lib/errors'
import { EMPTY_FORM, formValuesOf, plantFormSchema, type PlantFormValues, type PlantInput } from '@/lib/plants'
import { CautionSection, NameSection, PlaceSection, SizeSection, SourceSection, YearSection } from './form-sections'

export type SaveAnswer = { ok: true; value: { id: string } } | { ok: false; error: ErrorBody['error'] }

interface Props {
  /** The plant as it stands; absent when one is added. */
  plant?: PlantInput
  /** `base` is the plant as it was when the form was opened. */
  save: (plant: PlantInput, base: PlantInput | null) => Promise<SaveAnswer>
  /** Where leaving without saving leads. */
  back: string
}

type PlantForm = UseFormReturn<PlantFormValues, unknown, PlantInput>

const AWAY = 'The server could not be reached. Everything you typed is still here: try again.'

/** The browser asks before a page with unsaved entries is closed. */
function useUnloadQuestion(isDirty: boolean) {
  useEffect(() => {
    if (!isDirty) return
    const ask = (event: BeforeUnloadEvent) => event.preventDefault()
    window.addEventListener('beforeunload', ask)
    return () => window.removeEventListener('beforeunload', ask)
  }, [isDirty])
}

/** Puts the problems the server found at their fields. */
function showProblems(form: PlantForm, problems: ErrorBody['error']['problems'] = []) {
  problems.forEach(({ path, message }, i) => form.setError(path.join('.') as FieldPath<PlantFormValues>, { message }, { shouldFocus: i === 0 }))
}

function useSaving(form: PlantForm, { plant, save }: Props) {
  const router = useRouter()
  const [base, setBase] = useState(plant ?? null)
  const [message, setMessage] = useState<string | null>(null)
  const [saved, setSaved] = useState(false)
  const onValid = async (entered: PlantInput) => {
    setMessage(null)
    const answer = await save(entered, base).catch(() => null)
    if (!answer) return setMessage(AWAY)
    if (answer.ok) {
      setSaved(true)
      router.push(`/plants/${answer.value.id}` as Route)
      return router.refresh()
    }
    const { message: sentence, problems, current } = answer.error
    if (current) setBase(current as PlantInput)
    setMessage(sentence)
    showProblems(form, problems)
  }
  const onInvalid: SubmitErrorHandler<PlantFormValues> = (errors) => {
    const count = Object.keys(errors).length
    setMessage(`${count === 1 ? 'One field does' : `${count} fields do`} not fit yet. Nothing was saved.`)
  }
  return { message, saved, submit: form.handleSubmit(onValid, onInvalid) }
}

export function PlantForm(props: Props) {
  const { plant, back } = props
  const form = useForm<PlantFormValues, unknown, PlantInput>({
    resolver: zodResolver(plantFormSchema),
    defaultValues: plant ? formValuesOf(plant) : EMPTY_FORM,
    mode: 'onTouched',
  })
  const { isDirty, isSubmitting } = form.formState
  const { message, saved, submit } = useSaving(form, props)
  useUnloadQuestion(isDirty && !saved)
  return (
    <FormProvider {...form}>
      <form noValidate onSubmit={submit} className="grid grid-cols-1 gap-4">
        <NameSection />
        <SizeSection />
        <PlaceSection />
        <YearSection />
        <CautionSection />
        <SourceSection />
        <div className="sticky bottom-0 z-10 -mx-4 flex flex-wrap items-center gap-3 border-t border-rule bg-paper px-4 py-3">
          <Button type="submit" variant="primary" disabled={isSubmitting}>{isSubmitting ? 'Saving…' : plant ? 'Save changes' : 'Add plant'}</Button>
          <LinkButton href={back}>Leave without saving</LinkButton>
          <p role="alert" className="min-w-0 flex-1 text-conflict">{message}</p>
        </div>
      </form>
    </FormProvider>
  )
}
