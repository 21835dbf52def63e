// Fills a database: places and rules always, and the demo where DEMO is on. Started by `npm start` and `npm run seed`;
// doing it again changes nothing.
import { connect, db, disconnect } from '@/db/client'
import { findDemo } from '@/seed/demo/demo-mark'
import { writePeopleFile } from '@/seed/demo/write-people-file'
import { loadPlaces } from '@/seed/load-places'
import { loadRules } from '@/seed/load-rules'

const began = performance.now()
const say = (line: string) =>
  console.log(`${((performance.now() - began) / 1000).toFixed(1).padStart(5)} s  ${line}`)

async function layGround(isDemo: boolean): Promise<void> {
  await loadPlaces(db())
  say('places')
  await loadRules(db(), { demonstration: isDemo, at: new Date() })
  say(isDemo ? 'rules, with the demonstration ones' : 'rules')
}

async function run(): Promise<void> {
  const databaseUrl = process.env.DATABASE_URL
  const peopleFile = process.env.DEMO_PEOPLE_FILE
  const isDemo = process.env.DEMO === 'on'
  if (process.env.NODE_ENV === 'production' && isDemo) {
    throw new Error('The demo is refused in production: its people, its law rows and its money are invented.')
  }
  if (!databaseUrl) throw new Error('DATABASE_URL is missing: which database?')
  connect(databaseUrl)
  const found = await findDemo()
  if (isDemo && found === 'broken') {
    throw new Error('An earlier seed was cut short. Begin with an empty database: npm run seed.')
  }
  if (isDemo && peopleFile) await writePeopleFile(peopleFile)
  if (isDemo && found === 'whole') return say('the demo is there already: nothing to do')
  // Half the product comes with it: it loads while the places do.
  const demo = isDemo ? import('@/seed/demo/play-demo') : null
  await layGround(isDemo)
  if (demo) await (await demo).playDemo({ say })
  say('done')
}

try {
  await run()
} catch (error) {
  for (let at: unknown = error; at instanceof Error; at = at.cause) console.error(at.message)
  process.exitCode = 1
} finally {
  await disconnect()
}
