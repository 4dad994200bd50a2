import { cookies } from 'next/headers'
import type { ReactNode } from 'react'
import { StudioHeader } from '@/components/shell/studio-header'
import { can, type MemberRole } from '@/lib/access'
import { requireContext } from '@/lib/server/people/require-context'
import { signOutAction } from './account/actions'

const ROLE_WORDS: Record<MemberRole, string> = { owner: 'Owner', designer: 'Designer', reviewer: 'Reviewer', estimator: 'Estimator' }

/** The studio's frame. Each page brings its own main; the skip link leads to what holds it. */
export default async function StudioLayout({ children }: { children: ReactNode }) {
  const { actor } = await requireContext('member')
  const theme = (await cookies()).get('theme')?.value === 'outdoors' ? 'outdoors' : 'paper'
  const role = actor.role as MemberRole
  const places = [
    { href: '/projects', label: 'Projects' },
    ...(can(role, 'review:queue') ? [{ href: '/review', label: 'Review' }] : []),
    { href: '/plants', label: 'Plants' },
    { href: '/standards', label: 'Standards' },
    { href: '/account', label: 'Account' },
  ]
  return (
    <div className="min-h-dvh bg-paper text-ink">
      <a href="#main" className="sr-only z-50 bg-leaf px-4 py-3 font-bold text-sheet focus:not-sr-only focus:absolute focus:top-2 focus:left-2">Skip to the page</a>
      <StudioHeader person={{ name: actor.name, role: ROLE_WORDS[role] }} places={places} theme={theme} signOut={signOutAction} />
      <div id="main" tabIndex={-1} className="outline-none">{children}</div>
    </div>
  )
}
