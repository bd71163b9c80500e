import { touchActor } from '@/lib/auth/session'
import { listRevisions } from '@/lib/data/scenarios/list-revisions'
import { runRoute } from '@/lib/run-route'
import { queryOf } from '@/lib/schemas/list-query'

export function GET(request: Request, { params }: { params: Promise<{ id: string }> }): Promise<Response> {
  return runRoute(async () => listRevisions(await touchActor(), (await params).id, queryOf(new URL(request.url).searchParams)))
}
