import { touchActor } from '@/lib/auth/session'
import { getMe } from '@/lib/data/people/get-me'
import { runRoute } from '@/lib/run-route'

export function GET(): Promise<Response> {
  return runRoute(async () => getMe(await touchActor()))
}
