import type { Metadata } from 'next'
import { ProjectList } from '@/components/projects/project-list'
import { Button, EmptyState, LinkButton, PageHeader, TextField } from '@/components/ui'
import { can } from '@/lib/access'
import { requireContext } from '@/lib/server/people/require-context'
import { listProjects } from '@/lib/server/projects/list-projects'

export const metadata: Metadata = { title: 'Projects' }

interface Props {
  searchParams: Promise<{ q?: string | string[] }>
}

/** A list longer than this can be searched. */
const IN_SIGHT = 20
const NEW = <LinkButton href="/projects/new" variant="primary">New project</LinkButton>

function Search({ typed, found }: { typed: string; found: number }) {
  return (
    <form role="search" className="flex flex-wrap items-end gap-3">
      <TextField type="search" name="q" label="Find a project by its name, client or address" defaultValue={typed} className="w-full max-w-md" />
      <Button type="submit">Find</Button>
      {typed && <LinkButton href="/projects" variant="quiet">Show all</LinkButton>}
      <p role="status" className="flex min-h-11 items-center text-ink-soft">{typed && `${found === 1 ? 'One project fits' : `${found} projects fit`}`}</p>
    </form>
  )
}

export default async function ProjectsPage({ searchParams }: Props) {
  const context = await requireContext('member')
  const typed = ([(await searchParams).q ?? ''].flat()[0] ?? '').trim()
  const all = listProjects(context)
  const wanted = typed.toLocaleLowerCase('en-US')
  const shown = all.filter(({ name, address, clientName }) => [name, address, clientName].some((text) => text.toLocaleLowerCase('en-US').includes(wanted)))
  const add = can(context.actor.role, 'project:create') && NEW
  return (
    <main className="mx-auto grid max-w-[90rem] grid-cols-1 gap-5 px-4 py-6">
      <PageHeader title="Projects" actions={all.length > 0 && add} />
      {(all.length > IN_SIGHT || typed) && <Search typed={typed} found={shown.length} />}
      {all.length === 0 && <EmptyState title="No projects yet" action={add}>A project is one commission at one property. Its house fronts are measured and planted here.</EmptyState>}
      {all.length > 0 && shown.length === 0 && <EmptyState title="No project fits that" action={<LinkButton href="/projects">Show every project</LinkButton>}>Try fewer letters.</EmptyState>}
      {shown.length > 0 && <ProjectList projects={shown} />}
    </main>
  )
}
