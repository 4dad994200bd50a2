import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { ClientLinks } from '@/components/projects/client-links'
import { FacadeList } from '@/components/projects/facade-list'
import { ProjectForm } from '@/components/projects/project-form'
import { SiteFacts } from '@/components/projects/site-facts'
import { PageHeader } from '@/components/ui'
import { can } from '@/lib/access'
import { AppError } from '@/lib/errors'
import { STAGE_WORDS } from '@/lib/project'
import { listClientLinks } from '@/lib/server/clients/list-client-links'
import type { Context } from '@/lib/server/context'
import { requireContext } from '@/lib/server/people/require-context'
import { getProject } from '@/lib/server/projects/get-project'
import {
  addFacadeAction, createClientLinkAction, removeFacadeAction, renameFacadeAction, revokeClientLinkAction, saveProjectAction,
} from '../actions'

export const metadata: Metadata = { title: 'Project' }

function readProject(context: Context, projectId: string) {
  try {
    return getProject(context, { projectId })
  } catch (error) {
    if (error instanceof AppError && error.code === 'not-found') return null
    throw error
  }
}

export default async function ProjectPage({ params }: { params: Promise<{ projectId: string }> }) {
  const { projectId } = await params
  const context = await requireContext('member')
  const project = readProject(context, projectId)
  if (!project) notFound()
  const canEdit = can(context.actor.role, 'project:edit')
  const facadeActions = {
    add: addFacadeAction.bind(null, projectId), rename: renameFacadeAction.bind(null, projectId), remove: removeFacadeAction.bind(null, projectId),
  }
  return (
    <main className="mx-auto grid max-w-7xl grid-cols-1 gap-8 px-4 py-6">
      <PageHeader title={project.input.name} crumbs={[{ href: '/projects', label: 'Projects' }]}>
        {STAGE_WORDS[project.stage]}. Zone {project.input.zone}. {project.input.address}
      </PageHeader>
      <FacadeList projectId={projectId} facades={project.facades} canEdit={canEdit} actions={facadeActions} />
      {can(context.actor.role, 'client-link:create') && (
        <ClientLinks links={listClientLinks(context, { projectId })} create={createClientLinkAction.bind(null, projectId)} revoke={revokeClientLinkAction.bind(null, projectId)} />
      )}
      <section aria-labelledby="site-facts" className="grid gap-4">
        <h2 id="site-facts" className="font-heading text-2xl">Commission and site</h2>
        {canEdit
          ? <ProjectForm key={project.version} action={saveProjectAction.bind(null, projectId)} project={project.input} version={project.version} submit="Save" />
          : <SiteFacts project={project.input} />}
      </section>
    </main>
  )
}
