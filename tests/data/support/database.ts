import { MikroORM } from '@mikro-orm/postgresql'
import { randomBytes } from 'node:crypto'
import pg from 'pg'
import { afterAll, beforeAll, inject } from 'vitest'
import config from '@/mikro-orm.config'

type TestDatabase = { orm: MikroORM, url: string }

async function asAdmin(sql: string) {
  const client = new pg.Client({ connectionString: inject('adminUrl') })
  await client.connect()
  try {
    await client.query(sql)
  } finally {
    await client.end()
  }
}

/**
 * A fresh migrated database for the calling test file. It is filled in before the file's own hooks run, and
 * DATABASE_URL names it, so that the functions of lib/data reach the same rows as `orm`.
 */
export function useDatabase(): TestDatabase {
  const database = {} as TestDatabase
  const name = `${inject('templateDatabase').replace(/template$/, '')}${randomBytes(6).toString('hex')}`

  beforeAll(async () => {
    await asAdmin(`create database ${name} template ${inject('templateDatabase')}`)
    const url = new URL(inject('adminUrl'))
    url.pathname = `/${name}`
    process.env.DATABASE_URL = url.href
    database.url = url.href
    database.orm = await MikroORM.init({ ...config, clientUrl: url.href, dbName: name })
  })

  afterAll(async () => {
    await database.orm?.close(true)
    await asAdmin(`drop database if exists ${name} with (force)`)
  })
  return database
}
