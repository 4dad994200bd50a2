import type { Route } from 'next'
import Link from 'next/link'
import { plantQueryText, type PlantQuery } from '@/lib/plants'

const LINK = 'inline-flex min-h-11 items-center rounded-sm border border-ink-soft bg-sheet px-4 hover:bg-paper'

/** Goes from page to page of what was found; nothing where there is one page. */
export function Pager({ query, page, pages }: { query: PlantQuery; page: number; pages: number }) {
  if (pages <= 1) return null
  const to = (wanted: number) => `/plants?${plantQueryText({ ...query, page: wanted })}` as Route
  return (
    <nav aria-label="Pages of the library" className="flex items-center gap-4">
      {page > 1 && <Link href={to(page - 1)} rel="prev" className={LINK}>Page before</Link>}
      <span>Page {page} of {pages}</span>
      {page < pages && <Link href={to(page + 1)} rel="next" className={LINK}>Next page</Link>}
    </nav>
  )
}
