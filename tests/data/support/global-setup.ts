import { execFileSync } from 'node:child_process'
import pg from 'pg'
import type { TestProject } from 'vitest/node'

declare module 'vitest' {
  export interface ProvidedContext {
    adminUrl: string
    templateDatabase: string
  }
}

/** Databases of earlier runs that were killed: their names carry the process that made them. */
async function dropLeftovers(admin: pg.Client) {
  const { rows } = await admin.query<{ datname: string }>(String.raw`select datname from pg_database where datname ~ '^data_\d+_'`)
  for (const { datname } of rows) {
    const pid = Number(datname.split('_')[1])
    if (pid !== process.pid && !isAlive(pid)) await admin.query(`drop database if exists ${datname} with (force)`)
  }
}

function isAlive(pid: number) {
  try {
    process.kill(pid, 0)
    return true
  } catch {
    return false
  }
}

/** One migrated template database a run, in the cluster of the tests; each test file clones it. */
export default async function setup(project: TestProject) {
  const url = new URL(execFileSync(process.execPath, ['scripts/pg.mjs', 'start', '--test'], { encoding: 'utf8' }).trim())
  const admin = new pg.Client({ connectionString: url.href })
  await admin.connect()
  await dropLeftovers(admin)

  const template = `data_${process.pid}_template`
  await admin.query(`create database ${template}`)
  const templateUrl = new URL(url)
  templateUrl.pathname = `/${template}`
  execFileSync(process.execPath, ['--import', 'tsx', 'node_modules/@mikro-orm/cli/cli.js', 'migration:up'], {
    env: { ...process.env, DATABASE_URL: templateUrl.href, MIKRO_SNAPSHOT: '' },
    stdio: ['ignore', 'ignore', 'inherit'],
  })

  project.provide('adminUrl', url.href)
  project.provide('templateDatabase', template)
  return async () => {
    await admin.query(`drop database if exists ${template} with (force)`)
    await admin.end()
  }
}
