import { checkHealth } from '@/lib/server/health/check-health'
import { publicRoute } from '@/lib/server/http/route'

export const dynamic = 'force-dynamic'
export const GET = publicRoute(({ context }) => checkHealth(context))
