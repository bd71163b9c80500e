import { MikroORM } from '@mikro-orm/postgresql'
import { readdirSync } from 'node:fs'
import path from 'node:path'
import pg from 'pg'
import { afterAll, beforeAll, expect, inject, test } from 'vitest'
import { migrationsList } from '@/migrations/index'
import config from '@/mikro-orm.config'

const name = `schema_${process.pid}`
let admin: pg.Client
let orm: MikroORM
beforeAll(async () => {
  admin = new pg.Client({ connectionString: inject('adminUrl') })
  await admin.connect()
  await admin.query(`drop database if exists ${name} with (force)`)
  await admin.query(`create database ${name}`)
  const url = new URL(inject('adminUrl'))
  url.pathname = `/${name}`
  orm = await MikroORM.init({ ...config, clientUrl: url.href, dbName: name, logger: () => {}, migrations: { ...config.migrations, migrationsList } })
})
afterAll(async () => {
  await orm?.close(true)
  await admin.query(`drop database if exists ${name} with (force)`)
  await admin.end()
})

const tables = async () => {
  const rows = await orm.em.getConnection().execute<{ name: string }[]>(`select table_name as name from information_schema.tables where table_schema = 'public'`)
  return rows.map((row) => row.name).filter((table) => table !== 'mikro_orm_migrations').sort()
}

test('the list names every file of the folder in order', () => {
  const files = readdirSync(path.resolve(import.meta.dirname, '../../../migrations')).filter((file) => file.startsWith('Migration')).sort()
  expect(migrationsList.map((one) => `${one.name}.ts`)).toEqual(files)
})

test('migrations build exactly what the entities describe, take it all down again, and build it a second time', async () => {
  const migrator = orm.getMigrator()
  for (let round = 0; round < 2; round++) {
    expect((await migrator.up()).map((one) => one.name)).toEqual(migrationsList.map((one) => one.name))
    expect(await orm.getSchemaGenerator().getUpdateSchemaSQL()).toBe('')
    expect(await tables()).toEqual(expect.arrayContaining(['memberships', 'sessions', 'shops', 'sign_in_limits', 'users']))
    await migrator.down({ to: 0 })
    expect(await tables()).toEqual([])
  }
})
