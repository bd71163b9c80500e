import { readdirSync, readFileSync } from 'node:fs'
import path from 'node:path'

const root = path.resolve(import.meta.dirname, '../../..')

/** Files below a folder of the project, as paths from its root with forward slashes. */
function filesBelow(folder: string): string[] {
  return readdirSync(path.join(root, folder), { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile() && /\.tsx?$/.test(entry.name))
    .map((entry) => path.relative(root, path.join(entry.parentPath, entry.name)).replaceAll(path.sep, '/'))
    .sort()
}

export type Door = { name: string, kind: 'data' | 'action' | 'route', of: unknown }

function kindOf(file: string): Door['kind'] | null {
  if (file.startsWith('lib/data/')) return file.startsWith('lib/data/support/') ? null : 'data'
  if (/\/actions\.tsx?$/.test(file)) return 'action'
  return /\/route\.tsx?$/.test(file) ? 'route' : null
}

// A route file also exports settings of the framework; only its methods are doors.
const methods = ['GET', 'HEAD', 'POST', 'PUT', 'PATCH', 'DELETE', 'OPTIONS']

/** Every way into the server's data, found in the file tree. */
export async function collectDoors(): Promise<Door[]> {
  const doors: Door[] = []
  for (const file of [...filesBelow('lib/data'), ...filesBelow('app')]) {
    const kind = kindOf(file)
    if (!kind) continue
    const exported = await import(path.join(root, file)) as Record<string, unknown>
    for (const [name, of] of Object.entries(exported)) {
      if (kind !== 'route' || methods.includes(name)) doors.push({ name: `${file} ${name}`, kind, of })
    }
  }
  return doors
}

/** Files that hold server actions under another name than actions.ts, where the walk would not see them. */
export const hiddenActions = (): string[] =>
  [...filesBelow('app'), ...filesBelow('components'), ...filesBelow('lib')]
    .filter((file) => !/\/actions\.tsx?$/.test(file))
    .filter((file) => /^\s*(['"])use server\1/m.test(readFileSync(path.join(root, file), 'utf8')))
