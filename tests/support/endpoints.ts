/**
 * Every door of the product and who gets what at it: route handlers, pages and server actions. The access test finds
 * all of them in app/ and fails when one is missing here; the browser tests walk the pages by the same list.
 * `stranger` designs for the other studio, `otherClient` reads another project of the first one.
 */
import type { Permission } from '@/lib/access'

export const VIEWERS = ['owner', 'designer', 'reviewer', 'estimator', 'client', 'otherClient', 'stranger', 'nobody'] as const
export type Viewer = (typeof VIEWERS)[number]
type For<T> = Record<Viewer, T>

/** The ids of the test data that paths are filled with: all of the first studio. */
export interface Ids {
  projectId: string
  facadeId: string
  plantId: string
}

export interface RouteEndpoint {
  file: string
  method: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE'
  path: (ids: Ids) => string
  body?: 'sheet' | 'edits' | 'import' | 'preview' | 'spot'
  status: For<number>
  /** Asked by the owner's browser, from a page of another site. */
  crossSite: number
}

/** What a page does: shows itself, says there is nothing, says the role does not allow it, or sends on to a path. */
export type PageOutcome = 'shown' | 'absent' | 'refused' | `/${string}`

export interface PageEndpoint {
  file: string
  path: (ids: Ids) => string
  outcome: For<PageOutcome>
}

export interface ActionEndpoint {
  file: string
  /** Each exported action, and the permission its operation asks for; null: anyone, signed in or not. */
  actions: Record<string, Permission | null>
}

const status = (members: [number, number, number, number], rest: { client?: number; stranger: number; nobody?: number }): For<number> => ({
  owner: members[0], designer: members[1], reviewer: members[2], estimator: members[3],
  client: rest.client ?? 403, otherClient: rest.client ?? 403, stranger: rest.stranger, nobody: rest.nobody ?? 401,
})

/** Things of one studio, read by all its members. */
const readByMembers = status([200, 200, 200, 200], { stranger: 404 })
/** Things every member of any studio may ask. */
const openToMembers = status([200, 200, 200, 200], { stranger: 200 })

/** What owners and designers may change, each in their own studio. */
const madeByEditors = status([200, 200, 403, 403], { stranger: 200 })

const facade = (rest: string) => ({ facadeId }: Ids) => `/api/facades/${facadeId}/${rest}`

export const ROUTES: RouteEndpoint[] = [
  { file: 'app/api/health/route.ts', method: 'GET', path: () => '/api/health', status: status([200, 200, 200, 200], { client: 200, stranger: 200, nobody: 200 }), crossSite: 200 },
  { file: 'app/api/check/route.ts', method: 'POST', path: () => '/api/check', body: 'sheet', status: openToMembers, crossSite: 403 },
  { file: 'app/api/facades/[id]/sheet/route.ts', method: 'GET', path: facade('sheet'), status: readByMembers, crossSite: 200 },
  { file: 'app/api/facades/[id]/findings/route.ts', method: 'GET', path: facade('findings'), status: readByMembers, crossSite: 200 },
  { file: 'app/api/facades/[id]/plant-list/route.ts', method: 'GET', path: facade('plant-list?format=csv'), status: readByMembers, crossSite: 200 },
  { file: 'app/api/facades/[id]/edits/route.ts', method: 'POST', path: facade('edits'), body: 'edits', status: status([200, 200, 403, 403], { stranger: 404 }), crossSite: 403 },
  { file: 'app/api/facades/[id]/fits/route.ts', method: 'POST', path: facade('fits'), body: 'spot', status: readByMembers, crossSite: 403 },
  { file: 'app/api/plants/library/route.ts', method: 'GET', path: () => '/api/plants/library', status: openToMembers, crossSite: 200 },
  { file: 'app/api/plants/route.ts', method: 'GET', path: () => '/api/plants?q=ilex', status: openToMembers, crossSite: 200 },
  { file: 'app/api/plants/[id]/route.ts', method: 'GET', path: ({ plantId }) => `/api/plants/${plantId}`, status: readByMembers, crossSite: 200 },
  { file: 'app/api/plants/import/route.ts', method: 'POST', path: () => '/api/plants/import', body: 'import', status: madeByEditors, crossSite: 403 },
  { file: 'app/api/plants/import/preview/route.ts', method: 'POST', path: () => '/api/plants/import/preview', body: 'preview', status: madeByEditors, crossSite: 403 },
  { file: 'app/api/plants/import/template/route.ts', method: 'GET', path: () => '/api/plants/import/template', status: madeByEditors, crossSite: 200 },
]

/** A page for members: clients go to their own page, whoever is signed out to the sign-in. */
const members = (who: Partial<For<PageOutcome>> = {}): For<PageOutcome> => ({
  owner: 'shown', designer: 'shown', reviewer: 'shown', estimator: 'shown', client: '/view', otherClient: '/view', stranger: 'shown', nobody: '/sign-in', ...who,
})
const everyone = (outcome: PageOutcome): For<PageOutcome> => Object.fromEntries(VIEWERS.map((viewer) => [viewer, outcome])) as For<PageOutcome>
const ofTheStudio = (who: Partial<For<PageOutcome>> = {}) => members({ stranger: 'absent', ...who })
const drawing = (rest = '') => ({ projectId, facadeId }: Ids) => `/projects/${projectId}/facades/${facadeId}${rest}`

export const PAGES: PageEndpoint[] = [
  { file: 'app/page.tsx', path: () => '/', outcome: members({ owner: '/projects', designer: '/projects', reviewer: '/projects', estimator: '/projects', stranger: '/projects' }) },
  { file: 'app/(public)/sign-in/page.tsx', path: () => '/sign-in', outcome: { owner: '/projects', designer: '/projects', reviewer: '/projects', estimator: '/projects', stranger: '/projects', client: 'shown', otherClient: 'shown', nobody: 'shown' } },
  { file: 'app/(studio)/account/page.tsx', path: () => '/account', outcome: members() },
  { file: 'app/(studio)/projects/page.tsx', path: () => '/projects', outcome: members() },
  { file: 'app/(studio)/projects/new/page.tsx', path: () => '/projects/new', outcome: members({ reviewer: '/projects', estimator: '/projects' }) },
  { file: 'app/(studio)/projects/[projectId]/page.tsx', path: ({ projectId }) => `/projects/${projectId}`, outcome: ofTheStudio() },
  { file: 'app/(studio)/standards/page.tsx', path: () => '/standards', outcome: members() },
  { file: 'app/(studio)/review/page.tsx', path: () => '/review', outcome: members({ estimator: '/projects' }) },
  { file: 'app/(studio)/projects/[projectId]/facades/[facadeId]/plant-list/page.tsx', path: drawing('/plant-list'), outcome: ofTheStudio() },
  { file: 'app/(studio)/projects/[projectId]/facades/[facadeId]/page.tsx', path: drawing(), outcome: ofTheStudio() },
  { file: 'app/(studio)/projects/[projectId]/facades/[facadeId]/measure/page.tsx', path: drawing('/measure'), outcome: ofTheStudio() },
  { file: 'app/(studio)/plants/page.tsx', path: () => '/plants', outcome: members() },
  { file: 'app/(studio)/plants/new/page.tsx', path: () => '/plants/new', outcome: members({ reviewer: '/plants', estimator: '/plants' }) },
  { file: 'app/(studio)/plants/import/page.tsx', path: () => '/plants/import', outcome: members({ reviewer: '/plants', estimator: '/plants' }) },
  { file: 'app/(studio)/plants/[plantId]/page.tsx', path: ({ plantId }) => `/plants/${plantId}`, outcome: ofTheStudio() },
  { file: 'app/(studio)/plants/[plantId]/edit/page.tsx', path: ({ plantId }) => `/plants/${plantId}/edit`, outcome: ofTheStudio({ reviewer: '/plants', estimator: '/plants' }) },
  { file: 'app/(public)/c/[token]/page.tsx', path: () => '/c/never-made', outcome: everyone('shown') },
  { file: 'app/(client)/view/page.tsx', path: () => '/view', outcome: members({ owner: '/projects', designer: '/projects', reviewer: '/projects', estimator: '/projects', stranger: '/projects', client: 'shown', otherClient: 'shown' }) },
]

export const ACTIONS: ActionEndpoint[] = [
  { file: 'app/(public)/sign-in/actions.ts', actions: { signInAction: null } },
  { file: 'app/(studio)/account/actions.ts', actions: { changePasswordAction: 'own-password:change', signOutAction: null } },
  {
    file: 'app/(studio)/projects/actions.ts',
    actions: {
      createProjectAction: 'project:create', saveProjectAction: 'project:edit', addFacadeAction: 'project:edit', renameFacadeAction: 'project:edit',
      removeFacadeAction: 'project:edit', createClientLinkAction: 'client-link:create', revokeClientLinkAction: 'client-link:create',
    },
  },
  { file: 'app/(studio)/standards/actions.ts', actions: { saveStandardsAction: 'standards:edit' } },
  { file: 'app/(studio)/plants/actions.ts', actions: { createPlantAction: 'plant:edit', savePlantAction: 'plant:edit', removePlantAction: 'plant:edit' } },
  { file: 'app/(public)/c/[token]/open-garden.ts', actions: { openGarden: null } },
]

