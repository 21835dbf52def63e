import { existsSync } from 'node:fs'
import path from 'node:path'

import { demoPeopleFile } from './demo-people.mjs'
import { ROOT } from './project-root.mjs'
import { step, tell } from './tell.mjs'

/**
 * @typedef {Awaited<ReturnType<typeof import('./start-database.mjs').startDatabase>>} OwnDatabase
 * @param {import('./crew.mjs').Crew} crew
 * @param {{ database: OwnDatabase, dataDir: string, settings: Record<string, string | undefined> }} given
 */
export async function seedOnce(crew, { database, dataDir, settings }) {
  if (await database.isSeeded()) return
  if (!existsSync(path.join(ROOT, 'seed/run.ts'))) {
    tell('The database stays empty: there is no seed/run.ts.')
    return
  }
  const environment = {
    ...settings,
    DATABASE_OWNER_URL: database.ownerUrl,
    DEMO_PEOPLE_FILE: demoPeopleFile(dataDir),
  }
  const command = ['node', '--import', 'tsx', 'seed/run.ts']
  await step('Places, rules and demo people', () =>
    database.seedOnce(() => crew.run({ name: 'seed', command, environment })),
  )
}
