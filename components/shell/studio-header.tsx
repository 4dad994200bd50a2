import type { Route } from 'next'
import Link from 'next/link'
import { Button } from '@/components/ui'
import { StudioNav, type Place } from './studio-nav'
import { ThemeButton } from './theme-button'

interface StudioHeaderProps {
  person: { name: string; role: string }
  places: readonly Place[]
  theme: 'paper' | 'outdoors'
  signOut: () => Promise<void>
}

/** The strip above every page of the studio: one row, two on a phone. Its height is --studio-header. */
export function StudioHeader({ person, places, theme, signOut }: StudioHeaderProps) {
  return (
    <header className="flex h-(--studio-header) flex-wrap content-center items-center justify-between gap-x-3 border-b border-rule bg-sheet px-4 md:flex-nowrap print:hidden">
      <Link href={'/projects' as Route} className="flex min-h-11 shrink-0 items-center font-heading text-xl italic">Tenth Summer</Link>
      <div className="order-3 w-full min-w-0 md:order-2 md:w-auto md:flex-1">
        <StudioNav places={places} />
      </div>
      <div className="order-2 flex shrink-0 items-center md:order-3">
        <p className="hidden pr-2 text-right text-sm leading-tight lg:block">
          <span className="block max-w-48 truncate font-bold">{person.name}</span>
          <span className="block text-ink-soft">{person.role}</span>
        </p>
        <ThemeButton theme={theme} />
        <form action={signOut}>
          <Button type="submit" variant="quiet" className="-mr-3">Sign out</Button>
        </form>
      </div>
    </header>
  )
}
