import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { cache } from 'react'
import { AddFacade } from '@/components/projects/add-facade'
import { ClientLinks } from '@/components/projects/client-links'
import { FacadeCard } from '@/components/projects/facade-card'
import { FacadePicture } from '@/components/projects/facade-picture'
import { FacadeTools } from '@/components/projects/facade-tools'
import { ProjectForm } from '@/components/projects/project-form'
import { SiteFacts } from '@/components/projects/site-facts'
import { SitePanel } from '@/components/projects/site-panel'
import { StageBadge } from '@/components/projects/stage-badge'
import { EmptyState, PageHeader } from '@/components/ui'
import { can } from '@/lib/access'
import { AppError } from '@/lib/errors'
import { listClientLinks } from '@/lib/server/clients/list-client-links'
import type { Context } from '@/lib/server/context'
import { requireContext } from '@/lib/server/people/require-context'
import { getProject, type ProjectPage } from '@/lib/server/projects/get-project'
import { getSheet } from '@/lib/server/sheets/get-sheet'
import {
  addFacadeAction, createClientLinkAction, removeFacadeAction, renameFacadeAction, revokeClientLinkAction, saveProjectAction,
} from '../actions'

interface Props {
  params: Promise<{ projectId: string }>
}

/** The project of this page with who asks; null where it is not there or not theirs. Read once for page and title. */
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

function Facades({ context, project, canEdit }: { context: Context; project: ProjectPage; canEdit: boolean }) {
  const rename = renameFacadeAction.bind(null, project.id)
  const remove = removeFacadeAction.bind(null, project.id)
  return (
    <ul className="grid gap-5 lg:grid-cols-2">
      {project.facades.map((facade) => (
        <li key={facade.id} className="min-w-0">
          <FacadeCard
            projectId={project.id} facade={facade} canEdit={canEdit}
            picture={<FacadePicture facade={facade} sheet={getSheet(context, { facadeId: facade.id }).sheet} />}
            tools={canEdit && <FacadeTools facade={{ id: facade.id, name: facade.name, placements: facade.placements }} rename={rename} remove={remove} />}
          />
        </li>
      ))}
    </ul>
  )
}

export default async function ProjectOverview({ params }: Props) {
  const { projectId } = await params
  const found = await readProject(projectId)
  if (!found) notFound()
  const { context, project } = found
  const { input, facades, version } = project
  const canEdit = can(context.actor.role, 'project:edit')
  const add = canEdit && <AddFacade add={addFacadeAction.bind(null, projectId)} isFirst={facades.length === 0} />
  return (
    <main className="mx-auto grid max-w-[90rem] grid-cols-1 gap-8 px-4 py-6">
      <PageHeader title={input.name} crumbs={[{ href: '/projects', label: 'Projects' }]}>
        <p className="flex flex-wrap items-center gap-x-3 gap-y-1"><StageBadge stage={project.stage} />{[input.address, input.clientName && `for ${input.clientName}`].filter(Boolean).join(', ')}</p>
      </PageHeader>
      <section aria-labelledby="facades" className="grid grid-cols-1 gap-4">
        <div className="flex flex-wrap items-center justify-between gap-3">
          <h2 id="facades" className="font-heading text-2xl">Facades</h2>
          {facades.length > 0 && add}
        </div>
        {facades.length === 0
          ? <EmptyState title="No facade yet" action={add}>A facade is one measured side of the house. Its beds are drawn and checked here.</EmptyState>
          : <Facades context={context} project={project} canEdit={canEdit} />}
      </section>
      <SitePanel
        key={version} facts={<SiteFacts project={input} />}
        form={canEdit ? <ProjectForm action={saveProjectAction.bind(null, projectId)} project={input} version={version} submit="Save" /> : null}
      />
      {can(context.actor.role, 'client-link:create') && (
        <ClientLinks links={listClientLinks(context, { projectId })} create={createClientLinkAction.bind(null, projectId)} revoke={revokeClientLinkAction.bind(null, projectId)} />
      )}
    </main>
  )
}
