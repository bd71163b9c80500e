import { Migrator } from '@mikro-orm/migrations'
import { defineConfig } from '@mikro-orm/postgresql'
import { entities } from './entities/index'
import { databaseUrlOrEmpty } from './lib/database-url'

export default defineConfig({
  clientUrl: databaseUrlOrEmpty(),
  entities,
  extensions: [Migrator],
  dynamicImportProvider: (id: string) => import(/* turbopackIgnore: true */ id),
  forceUtcTimezone: true,
  pool: { min: 0, max: 10 },
  migrations: {
    path: './migrations',
    pathTs: './migrations',
    glob: 'Migration*.{js,ts}',
    // up and down rewrite the snapshot from the live database; only the CLI script may do that
    snapshot: process.env.MIKRO_SNAPSHOT === '1',
    snapshotName: '.snapshot',
    emit: 'ts',
  },
})
