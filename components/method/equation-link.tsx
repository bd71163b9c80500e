import { methodPath } from '@/lib/method/anchors'
import type { EquationId } from '@/lib/method/topics'

/** From a result to its equation. Beside this page and not in its place: what is typed on a sheet may not be saved yet. */
export function EquationLink({ id, of, children = 'equation' }: { id: EquationId, of: string, children?: string }) {
  return <a className="eqlink" href={methodPath(id)} target="_blank" rel="noopener">{children}<span className="sr"> of {of}, opens beside this page</span></a>
}
