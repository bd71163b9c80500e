import { touchActor } from '@/lib/auth/session'
import { listScenarios } from '@/lib/data/scenarios/list-scenarios'
import { runRoute } from '@/lib/run-route'
import { queryOf } from '@/lib/schemas/list-query'

export function GET(request: Request): Promise<Response> {
  return runRoute(async () => listScenarios(await touchActor(), queryOf(new URL(request.url).searchParams)))
}
