import 'server-only'
import { readdir, readFile } from 'node:fs/promises'
import path from 'node:path'
import type { PublishedCase } from '@/tests/published/published-case'

const folder = path.join(process.cwd(), 'tests', 'published', 'cases')

/** Equal arguments become one object, so that the page is sent them once. */
function shareArguments(published: PublishedCase): PublishedCase {
  const seen = new Map<string, readonly unknown[]>()
  const share = (args: readonly unknown[]) => {
    const text = JSON.stringify(args)
    const known = seen.get(text)
    if (!known) seen.set(text, args)
    return known ?? args
  }
  return { ...published, checks: published.checks.map((check) => ({ ...check, args: share(check.args), ...(check.over ? { over: { ...check.over, args: share(check.over.args) } } : {}) })) }
}

async function readAll(): Promise<readonly PublishedCase[]> {
  const files = (await readdir(folder)).filter((name) => name.endsWith('.json')).sort()
  return Promise.all(files.map(async (file) => shareArguments(JSON.parse(await readFile(path.join(folder, file), 'utf8')))))
}

let kept: Promise<readonly PublishedCase[]> | null = null

/** The published checks that the tests run on, from the same files. They do not change while a server runs, but for a developer's. */
export function readCases(): Promise<readonly PublishedCase[]> {
  if (process.env.NODE_ENV !== 'production') return readAll()
  kept ??= readAll().catch((error: unknown) => {
    kept = null
    throw error
  })
  return kept
}
