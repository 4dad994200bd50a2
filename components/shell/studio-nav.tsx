'use client'
import type { Route } from 'next'
import Link from 'next/link'
import { usePathname } from 'next/navigation'

export interface Place {
  href: string
  label: string
}

/** The rooms of the studio; the one we are in is underlined and says so to screen readers. */
export function StudioNav({ places }: { places: readonly Place[] }) {
  const path = usePathname()
  return (
    <nav aria-label="Studio" className="min-w-0">
      <ul className="flex h-12 items-stretch overflow-x-auto md:h-16">
        {places.map(({ href, label }) => {
          const isHere = path === href || path.startsWith(`${href}/`)
          return (
            <li key={href} className="flex">
              <Link
                href={href as Route}
                aria-current={path === href ? 'page' : isHere ? 'true' : undefined}
                className="flex min-w-11 items-center border-y-3 border-transparent px-3 hover:border-b-rule focus-visible:-outline-offset-2 aria-[current]:border-b-leaf aria-[current]:font-bold"
              >
                {label}
              </Link>
            </li>
          )
        })}
      </ul>
    </nav>
  )
}
