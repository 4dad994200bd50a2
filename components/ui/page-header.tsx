import Link from 'next/link'
import type { Route } from 'next'
import type { ReactNode } from 'react'

export interface Crumb {
  href: string
  label: string
}

interface PageHeaderProps {
  title: ReactNode
  /** The way up from this page, outermost first; the page itself is not among them. */
  crumbs?: readonly Crumb[]
  /** Buttons of the whole page. */
  actions?: ReactNode
  /** What the page is about, in a line or two. */
  children?: ReactNode
}

/** The top of a page: the way up, its one h1, its buttons. */
export function PageHeader({ title, crumbs = [], actions, children }: PageHeaderProps) {
  return (
    <header className="border-b border-rule pb-4">
      {crumbs.length > 0 && (
        <nav aria-label="The way up" className="print:hidden">
          <ol className="flex flex-wrap items-center gap-x-2 text-ink-soft">
            {crumbs.map(({ href, label }, i) => (
              <li key={href} className="flex items-center gap-2">
                {i > 0 && <span aria-hidden="true">/</span>}
                <Link href={href as Route} className="inline-flex min-h-11 items-center underline decoration-rule underline-offset-4 hover:text-ink hover:decoration-ink">{label}</Link>
              </li>
            ))}
          </ol>
        </nav>
      )}
      <div className="flex flex-wrap items-end justify-between gap-x-6 gap-y-3">
        <div className="min-w-0">
          <h1 className="font-heading text-3xl leading-tight break-words">{title}</h1>
          {children && <div className="mt-1 max-w-prose text-ink-soft">{children}</div>}
        </div>
        {actions && <div className="flex flex-wrap gap-3 print:hidden">{actions}</div>}
      </div>
    </header>
  )
}
