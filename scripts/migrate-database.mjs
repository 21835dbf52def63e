// Shapes the tables: `DATABASE_OWNER_URL=mysql://… node scripts/migrate-database.mjs`. The app's own user may not.
import path from 'node:path'

import { register } from 'tsx/esm/api'

import { ROOT } from './project-root.mjs'

const url = process.env.DATABASE_OWNER_URL
if (!url) {
  console.error('DATABASE_OWNER_URL is missing: the address of the account that may shape tables.')
  process.exit(1)
}
register()
const { migrateDatabase } = await import(path.join(ROOT, 'db/migrate.ts'))
await migrateDatabase(url)
