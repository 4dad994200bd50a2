import { LinkButton } from '@/components/ui'
import { plantQueryText, type PlantQuery } from '@/lib/plants'

/** Goes from page to page of what was found; nothing where there is one page. */
export function Pager({ query, page, pages }: { query: PlantQuery; page: number; pages: number }) {
  if (pages <= 1) return null
  const to = (wanted: number) => `/plants?${plantQueryText({ ...query, page: wanted })}`
  return (
    <nav aria-label="Pages of the library" className="flex items-center gap-4">
      {page > 1 && <LinkButton href={to(page - 1)} rel="prev">Page before</LinkButton>}
      <span>Page {page} of {pages}</span>
      {page < pages && <LinkButton href={to(page + 1)} rel="next">Next page</LinkButton>}
    </nav>
  )
}
