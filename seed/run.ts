// Fills a database: places and rules always, and the demo where DEMO is on. `--small`: the same people, fewer listings
// and orders, for tests. Started by `npm start` and `npm run seed`; doing it again changes nothing.
import { parseArgs } from 'node:util'

import { connect, db, disconnect } from '@/db/client'
import { configurePayments } from '@/payments/stripe'
import { findDemo } from '@/seed/demo/demo-mark'
import { seedDemo } from '@/seed/demo/seed-demo'
import { openWebhookDoor } from '@/seed/demo/webhook-door'
import { writePeopleFile } from '@/seed/demo/write-people-file'
import { loadPlaces } from '@/seed/load-places'
import { loadRules } from '@/seed/load-rules'
import { openAuth } from '@/server/auth/auth'
import { readSettings } from '@/server/env'
import { log } from '@/server/log'
import { configureOrders } from '@/server/orders/order-settings'
import { configurePhotos } from '@/server/photos/photo-files'

const VALLEY = ['OH', 'KY', 'IN']

const began = performance.now()
const say = (line: string) =>
  console.log(`${((performance.now() - began) / 1000).toFixed(1).padStart(5)} s  ${line}`)

async function layGround(isDemo: boolean, isSmall: boolean): Promise<void> {
  await loadPlaces(db(), isSmall ? { states: VALLEY } : undefined)
  say(isSmall ? `places of ${VALLEY.join(', ')}` : 'places of the whole country')
  await loadRules(db(), { demonstration: isDemo, at: new Date() })
  say(isDemo ? 'rules, with the demonstration ones' : 'rules')
}

async function playDemo(isSmall: boolean): Promise<void> {
  const settings = readSettings()
  log.level = 'warn'
  const { PUBLIC_ORIGIN: origin, STRIPE_API_BASE: processor } = settings
  if (!processor)
    throw new Error('The demo pays with practice cards: STRIPE_API_BASE must name the practice processor.')
  const { hostname: host, port, protocol } = new URL(processor)
  openAuth({ secret: settings.AUTH_SECRET, origin, alsoTrusted: [] })
  configureOrders({ origin, feeBp: settings.FEE_BP })
  configurePhotos({ dir: settings.UPLOAD_DIR })
  configurePayments({
    secretKey: settings.STRIPE_SECRET_KEY,
    webhookSecret: settings.STRIPE_WEBHOOK_SECRET,
    ...{ host, port: Number(port), protocol: protocol === 'https:' ? 'https' : 'http' },
  })
  const door = await openWebhookDoor({ host: settings.HOST, port: settings.PORT })
  try {
    await seedDemo({ clockOffsetMs: settings.CLOCK_OFFSET_MS, isSmall, say })
  } finally {
    await door.close()
  }
}

async function run(): Promise<void> {
  const { small: isSmall } = parseArgs({ options: { small: { type: 'boolean', default: false } } }).values
  const databaseUrl = process.env.DATABASE_URL
  const peopleFile = process.env.DEMO_PEOPLE_FILE
  const isDemo = process.env.DEMO === 'on'
  if (process.env.NODE_ENV === 'production' && (isDemo || isSmall)) {
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
  await layGround(isDemo, isSmall)
  if (isDemo) await playDemo(isSmall)
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
