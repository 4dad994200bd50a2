'use client'
import { useActionState } from 'react'
import { Button, Notice, TextField } from '@/components/ui'

interface SignInState {
  email: string
  error: string | null
}

interface SignInFormProps {
  action: (before: SignInState, form: FormData) => Promise<SignInState>
  /** Where to go on afterwards, a path of ours. */
  next: string | null
}

/** E-mail address and password. Works before the page's scripts have come, too. */
export function SignInForm({ action, next }: SignInFormProps) {
  const [state, submit, isPending] = useActionState(action, { email: '', error: null })
  return (
    <form action={submit} className="grid gap-4">
      {state.error && <Notice tone="error">{state.error}</Notice>}
      {next && <input type="hidden" name="next" value={next} />}
      <TextField name="email" type="email" label="E-mail address" autoComplete="username" autoCapitalize="none" spellCheck={false} required maxLength={320} defaultValue={state.email} />
      <TextField name="password" type="password" label="Password" autoComplete="current-password" required maxLength={1024} />
      <Button type="submit" variant="primary" aria-disabled={isPending} className="mt-1">{isPending ? 'Signing in' : 'Sign in'}</Button>
    </form>
  )
}
