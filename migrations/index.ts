import { Migration20261201042125_people } from './Migration20261201042125_people'
import { Migration20261201042707_records } from './Migration20261201042707_records'

/** Every migration in order, for the migrator that runs inside another process (tests); the CLI reads the folder. */
export const migrationsList = [
  { name: 'Migration20261201042125_people', class: Migration20261201042125_people },
  { name: 'Migration20261201042707_records', class: Migration20261201042707_records },
]
