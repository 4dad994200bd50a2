import type { Metadata } from 'next'
import { redirect } from 'next/navigation'
import { ProjectForm } from '@/components/projects/project-form'
import { PageHeader } from '@/components/ui'
import { can } from '@/lib/access'
import { requireContext } from '@/lib/server/people/require-context'
import { createProjectAction } from '../actions'

export const metadata: Metadata = { title: 'New project' }

export default async function NewProjectPage() {
  const { actor } = await requireContext('member')
  if (!can(actor.role, 'project:create')) redirect('/projects')
  return (
    <main className="mx-auto grid max-w-4xl grid-cols-1 gap-6 px-4 py-6">
      <PageHeader title="New project" crumbs={[{ href: '/projects', label: 'Projects' }]} />
      <ProjectForm action={createProjectAction} submit="Make the project" />
    </main>
  )
}
