import { isSeeded, seedAndMark } from './demo-ground.mjs'
import { demoPeopleFile } from './demo-people.mjs'
import { step } from './tell.mjs'

/**
 * @param {import('./crew.mjs').Crew} crew
 * @param {{ dataDir: string, ownerUrl: string, settings: Record<string, string | undefined> }} given
 */
export async function seedOnce(crew, { dataDir, ownerUrl, settings }) {
  if (await isSeeded(dataDir)) return
  const environment = {
    ...settings,
    DATABASE_OWNER_URL: ownerUrl,
    DEMO_PEOPLE_FILE: demoPeopleFile(dataDir),
  }
  const command = ['node', '--import', 'tsx', 'seed/run.ts']
  await step(
    'Places, rules and demo people',
    () => seedAndMark(dataDir, () => crew.run({ name: 'seed', command, environment })),
    // Its lines begin with its own seconds.
    async () =>
      (await crew.wordsOf('seed'))
        .split('\n')
        .at(-1)
        ?.replace(/^[\d. ]+s +/, '') ?? '',
  )
}
