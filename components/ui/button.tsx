import Link from 'next/link'
import type { Route } from 'next'
import type { ComponentProps } from 'react'

export type ButtonVariant = 'primary' | 'secondary' | 'quiet' | 'danger'

const BASE =
  'inline-flex min-h-11 min-w-11 items-center justify-center gap-2 rounded-sm px-4 text-center focus-visible:outline-2 focus-visible:outline-offset-2 focus-visible:outline-leaf disabled:cursor-not-allowed disabled:opacity-60 aria-disabled:opacity-60'

const VARIANTS: Record<ButtonVariant, string> = {
  primary: 'bg-leaf font-bold text-sheet hover:bg-ink',
  secondary: 'border border-ink-soft bg-sheet text-ink hover:bg-paper',
  quiet: 'text-ink underline decoration-rule underline-offset-4 hover:decoration-ink',
  danger: 'border border-conflict bg-sheet font-bold text-conflict hover:bg-conflict hover:text-sheet',
}

/** The classes of a button, for elements that must look like one without being one. */
export function buttonClass(variant: ButtonVariant = 'secondary', extra = ''): string {
  return [BASE, VARIANTS[variant], extra].filter(Boolean).join(' ')
}

interface ButtonProps extends ComponentProps<'button'> {
  variant?: ButtonVariant
}

/** A button at least 44 px each way. It submits nothing unless told so by `type`. */
export function Button({ variant = 'secondary', className, type = 'button', ...rest }: ButtonProps) {
  return <button type={type} className={buttonClass(variant, className)} {...rest} />
}

interface LinkButtonProps extends Omit<ComponentProps<typeof Link>, 'href'> {
  href: string
  variant?: ButtonVariant
}

/** A link to a page of ours that looks like a button. */
export function LinkButton({ href, variant = 'secondary', className, ...rest }: LinkButtonProps) {
  return <Link href={href as Route} className={buttonClass(variant, className)} {...rest} />
}
