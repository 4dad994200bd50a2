'use client'
import { Dialog as Radix } from 'radix-ui'
import type { ReactNode } from 'react'
import { buttonClass } from './button'

interface DialogProps {
  title: string
  /** What it is about, in a line; read out with the title. */
  description?: ReactNode
  /** The button that opens it. Leave it out where `open` is held outside. */
  trigger?: ReactNode
  open?: boolean
  onOpenChange?: (isOpen: boolean) => void
  children?: ReactNode
}

/** A window over the page that holds the focus until it is closed; Escape closes it too. */
export function Dialog({ title, description, trigger, open, onOpenChange, children }: DialogProps) {
  return (
    <Radix.Root {...(open === undefined ? {} : { open })} {...(onOpenChange ? { onOpenChange } : {})}>
      {trigger && <Radix.Trigger asChild>{trigger}</Radix.Trigger>}
      <Radix.Portal>
        <Radix.Overlay className="fixed inset-0 z-40 bg-ink/40" />
        <Radix.Content
          {...(description ? {} : { 'aria-describedby': undefined })}
          className="fixed top-1/2 left-1/2 z-50 max-h-[88dvh] w-[min(34rem,94vw)] -translate-x-1/2 -translate-y-1/2 overflow-y-auto border border-ink bg-sheet p-6 text-ink"
        >
          <div className="flex items-start justify-between gap-4">
            <Radix.Title className="font-heading text-2xl leading-tight">{title}</Radix.Title>
            <Radix.Close className={buttonClass('secondary', 'shrink-0')}>Close</Radix.Close>
          </div>
          {description && <Radix.Description asChild><div className="mt-2 text-ink-soft">{description}</div></Radix.Description>}
          {children && <div className="mt-4">{children}</div>}
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  )
}
