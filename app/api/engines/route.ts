import { touchActor } from '@/lib/auth/session'
import { listEngines } from '@/lib/data/engines/list-engines'
import { runRoute } from '@/lib/run-route'
import { queryOf } from '@/lib/schemas/list-query'

export function GET(request: Request): Promise<Response> {
  return runRoute(async () => listEngines(await touchActor(), queryOf(new URL(request.url).searchParams)))
}
