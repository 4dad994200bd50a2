'use client'
import { useState, type ReactNode } from 'react'
import { Button } from '@/components/ui'

interface Props {
  /** The facts, to read. */
  facts: ReactNode
  /** The form, where one may change them. */
  form: ReactNode | null
}

/** The commission and its site: read at a glance, changed on demand. */
export function SitePanel({ facts, form }: Props) {
  const [isOpen, setOpen] = useState(false)
  return (
    <section aria-labelledby="site-facts" className="grid grid-cols-1 gap-4">
      <div className="flex flex-wrap items-center justify-between gap-3">
        <h2 id="site-facts" className="font-heading text-2xl">Commission and site</h2>
        {form && <Button aria-expanded={isOpen} onClick={() => setOpen(!isOpen)}>{isOpen ? 'Leave it as it is' : 'Change'}</Button>}
      </div>
      {isOpen && form ? form : facts}
    </section>
  )
}
