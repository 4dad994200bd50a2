import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { cache } from 'react'
import { ClientLinks } from '@/components/projects/client-links'
import { FacadeList } from '@/components/projects/facade-list'
import { ProjectForm } from '@/components/projects/project-form'
import { SiteFacts } from '@/components/projects/site-facts'
import { PageHeader } from '@/components/ui'
import { can } from '@/lib/access'
import { AppError } from '@/lib/errors'
import { STAGE_WORDS } from '@/lib/project'
import { LINK_DAYS } from '@/lib/server/clients/create-client-link'
import { listClientLinks } from '@/lib/server/clients/list-client-links'
import { requireContext } from '@/lib/server/people/require-context'
import { getProject } from '@/lib/server/projects/get-project'
import {
  addFacadeAction, createClientLinkAction, removeFacadeAction, renameFacadeAction, revokeClientLinkAction, saveProjectAction,
} from '../actions'

interface Props {
  params: Promise<{ projectId: string }>
}

/** The project of this page and who asks; null where it is not there or not theirs. Read once for page and title. */
const readProject = cache(async (projectId: string) => {
  const context = await requireContext('member')
  try {
    return { context, project: getProject(context, { projectId }) }
  } catch (error) {
    if (error instanceof AppError && error.code === 'not-found') return null
    throw error
  }
})

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const found = await readProject((await params).projectId)
  return { title: found?.project.input.name ?? 'Nothing here' }
}

export default async function ProjectPage({ params }: Props) {
  const { projectId } = await params
  const found = await readProject(projectId)
  if (!found) notFound()
  const { context, project } = found
  const { role } = context.actor
  const canEdit = can(role, 'project:edit')
  const may = { look: can(role, 'sheet:read'), draw: can(role, 'sheet:edit'), list: can(role, 'takeoff:read'), edit: canEdit }
  const facadeActions = {
    add: addFacadeAction.bind(null, projectId), rename: renameFacadeAction.bind(null, projectId), remove: removeFacadeAction.bind(null, projectId),
  }
  return (
    <main className="mx-auto grid max-w-7xl grid-cols-1 gap-8 px-4 py-6">
      <PageHeader title={project.input.name} crumbs={[{ href: '/projects', label: 'Projects' }]}>
        {STAGE_WORDS[project.stage]}. Zone {project.input.zone}. {project.input.address}
      </PageHeader>
      <FacadeList projectId={projectId} facades={project.facades} may={may} actions={facadeActions} />
      {can(role, 'client-link:create') && (
        <ClientLinks links={listClientLinks(context, { projectId })} days={LINK_DAYS} create={createClientLinkAction.bind(null, projectId)} revoke={revokeClientLinkAction.bind(null, projectId)} />
      )}
      <section aria-labelledby="site-facts" className="grid gap-4">
        <h2 id="site-facts" className="font-heading text-2xl">Commission and site</h2>
        {canEdit
          ? <ProjectForm action={saveProjectAction.bind(null, projectId)} project={project.input} version={project.version} submit="Save" />
          : <SiteFacts project={project.input} />}
      </section>
    </main>
  )
}
