import type { Metadata } from 'next'
import { ProjectCard } from '@/components/projects/project-card'
import { Button, EmptyState, LinkButton, PageHeader, TextField } from '@/components/ui'
import { can } from '@/lib/access'
import { requireContext } from '@/lib/server/people/require-context'
import { listProjects } from '@/lib/server/projects/list-projects'

export const metadata: Metadata = { title: 'Projects' }

interface Props {
  searchParams: Promise<{ q?: string | string[] }>
}

const NEW = <LinkButton href="/projects/new" variant="primary">New project</LinkButton>

export default async function ProjectsPage({ searchParams }: Props) {
  const context = await requireContext('member')
  const typed = [(await searchParams).q ?? ''].flat()[0]!.trim()
  const all = listProjects(context)
  const wanted = typed.toLocaleLowerCase('en-US')
  const shown = all.filter(({ name, address, clientName }) => `${name} ${address} ${clientName}`.toLocaleLowerCase('en-US').includes(wanted))
  const canCreate = can(context.actor.role, 'project:create')
  return (
    <main className="mx-auto grid max-w-7xl grid-cols-1 gap-5 px-4 py-6">
      <PageHeader title="Projects" actions={canCreate && all.length > 0 && NEW} />
      {all.length > 0 && (
        <form role="search" className="flex flex-wrap items-end gap-3">
          <TextField type="search" name="q" label="Find by project, client or address" defaultValue={typed} className="w-full max-w-md" />
          <Button type="submit">Find</Button>
        </form>
      )}
      {all.length === 0 && <EmptyState title="No projects yet" action={canCreate && NEW}>A project is one commission at one property. Its house fronts are measured and planted here.</EmptyState>}
      {all.length > 0 && shown.length === 0 && <EmptyState title="No project fits that" action={<LinkButton href="/projects">Show every project</LinkButton>}>Try fewer letters.</EmptyState>}
      <ul className="grid gap-4 md:grid-cols-2 xl:grid-cols-3">
        {shown.map((project) => <li key={project.id}><ProjectCard project={project} /></li>)}
      </ul>
    </main>
  )
}
