'use client'
import { useActionState, useRef } from 'react'
import { Button, Notice, TextField } from '@/components/ui'
import { DemoSignIns, type Demo } from './demo-sign-ins'

interface SignInState {
  email: string
  error: string | null
}

interface SignInFormProps {
  action: (before: SignInState, form: FormData) => Promise<SignInState>
  /** Where to go on afterwards, a path of ours. */
  next: string | null
  /** The demonstration's accounts, where this is one. */
  demo: Demo | null
}

/** E-mail address and password. Works before the page's scripts have come, too. */
export function SignInForm({ action, next, demo }: SignInFormProps) {
  const [state, submit, isPending] = useActionState(action, { email: '', error: null })
  const form = useRef<HTMLFormElement>(null)
  const fill = (email: string, password: string) => {
    for (const [name, value] of Object.entries({ email, password })) form.current!.querySelector<HTMLInputElement>(`[name=${name}]`)!.value = value
    form.current!.querySelector<HTMLButtonElement>('[type=submit]')!.focus()
  }
  return (
    <>
      <form ref={form} action={submit} className="grid gap-4">
        {state.error && <Notice tone="error">{state.error}</Notice>}
        {next && <input type="hidden" name="next" value={next} />}
        <TextField name="email" type="email" label="E-mail address" autoComplete="username" autoCapitalize="none" spellCheck={false} required maxLength={320} defaultValue={state.email} />
        <TextField name="password" type="password" label="Password" autoComplete="current-password" required maxLength={1024} />
        <Button type="submit" variant="primary" aria-disabled={isPending} className="mt-1">{isPending ? 'Signing in' : 'Sign in'}</Button>
      </form>
      {demo && <DemoSignIns demo={demo} onPick={fill} />}
    </>
  )
}
