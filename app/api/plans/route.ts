import { touchActor } from '@/lib/auth/session'
import { listPlans } from '@/lib/data/plans/list-plans'
import { runRoute } from '@/lib/run-route'
import { queryOf } from '@/lib/schemas/list-query'

export function GET(request: Request): Promise<Response> {
  return runRoute(async () => listPlans(await touchActor(), queryOf(new URL(request.url).searchParams)))
}
