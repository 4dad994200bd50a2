'use client'
import { useActionState, useState } from 'react'
import { Button, CheckboxField, Notice, TextField } from '@/components/ui'
import { MIN_PASSWORD, passwordProblem } from '@/lib/access'

interface PasswordState {
  isDone: boolean
  error: string | null
  fields: { current?: string; next?: string; again?: string }
}

interface PasswordFormProps {
  email: string
  action: (before: PasswordState, form: FormData) => Promise<PasswordState>
}

const UNTRIED: PasswordState = { isDone: false, error: null, fields: {} }

/** Changes one's own password. A weak one is named when its field is left, by the rule the server decides by. */
export function PasswordForm({ email, action }: PasswordFormProps) {
  const [state, submit, isPending] = useActionState(action, UNTRIED)
  const [weakness, setWeakness] = useState<string | null>(null)
  const [isShown, setShown] = useState(false)
  const type = isShown ? 'text' : 'password'
  return (
    <form action={submit} className="grid max-w-md gap-4">
      {state.isDone && <Notice tone="good" title="Your password is changed">Other devices you were signed in on are signed out.</Notice>}
      {state.error && <Notice tone="error">{state.error}</Notice>}
      <input type="email" name="email" autoComplete="username" value={email} readOnly hidden />
      <TextField name="current" type={type} label="Password now" autoComplete="current-password" required maxLength={1024} error={state.fields.current} />
      <TextField
        name="next" type={type} label="New password" autoComplete="new-password" required maxLength={1024}
        hint={`At least ${MIN_PASSWORD} characters, a few words with spaces are fine. Not your e-mail address, a run of keys or a word everyone tries.`}
        error={weakness ?? state.fields.next}
        onBlur={(event) => setWeakness(event.target.value ? passwordProblem(event.target.value, email) : null)}
      />
      <TextField name="again" type={type} label="New password, once more" autoComplete="new-password" required maxLength={1024} error={state.fields.again} />
      <CheckboxField label="Show what I type" checked={isShown} onChange={(event) => setShown(event.target.checked)} />
      <Button type="submit" variant="primary" aria-disabled={isPending} className="justify-self-start">{isPending ? 'Changing' : 'Change the password'}</Button>
    </form>
  )
}
