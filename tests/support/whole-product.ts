import { readdir, rm } from 'node:fs/promises'
import path from 'node:path'

import holidays from '@18f/us-federal-holidays'
import type { TestProject } from 'vitest/node'

import { makeCrew } from '@/scripts/crew.mjs'
import { sentenceOf } from '@/scripts/fault.mjs'
import { commandOf, stopLeftover } from '@/scripts/mariadb-leftover.mjs'
import { plainEnvironment } from '@/scripts/plain-environment.mjs'
import { takeOver } from '@/scripts/run-note.mjs'
import { startProduct } from '@/scripts/start-product.mjs'

export interface WholeProduct {
  origin: string
  mailOrigin: string
  payOrigin: string
  weatherOrigin: string
  /** As the product signs in. */
  databaseUrl: string
  /** How far the product's own date runs ahead of the real one. */
  clockOffsetMs: number
  /** Holds demo-people.json, logs and uploads of this run. */
  dataDir: string
}

declare module 'vitest' {
  interface ProvidedContext {
    wholeProduct: WholeProduct
  }
}

const PARENT = path.resolve('.data/e2e')

const DAY_MS = 86_400_000
const TUESDAY = 2

/**
 * Boxes leave on Mondays to Wednesdays: journeys run on the next Tuesday without a holiday about it, whatever the day
 * of the run. In the hours of a UTC Tuesday it is Monday or Tuesday all over the United States.
 */
function msToShipDay(now: Date): number {
  const year = now.getUTCFullYear()
  const noCarriers = new Set(
    [year, year + 1].flatMap((one) => holidays.allForYear(one)).map((one) => one.dateString),
  )
  for (let days = 0; ; days++) {
    const at = new Date(now.getTime() + days * DAY_MS)
    const about = [-1, 0, 1, 2].map((more) =>
      new Date(at.getTime() + more * DAY_MS).toISOString().slice(0, 10),
    )
    if (at.getUTCDay() === TUESDAY && !about.some((day) => noCarriers.has(day))) return days * DAY_MS
  }
}

/** Ends and removes what runs left behind that were killed. */
async function sweep(): Promise<void> {
  for (const name of await readdir(PARENT).catch(() => [])) {
    if ((await commandOf(Number(name))) !== null) continue
    const dir = path.join(PARENT, name)
    await takeOver(dir)
    await stopLeftover(path.join(dir, 'mariadb'))
    await rm(dir, { recursive: true, force: true })
  }
}

/**
 * Everything that `npm start` starts, once a run, on throw-away data and free ports. While writing a journey,
 * RUNNING_PRODUCT (JSON of WholeProduct) names a product that runs already.
 */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const running = process.env.RUNNING_PRODUCT
  if (running) {
    project.provide('wholeProduct', JSON.parse(running) as WholeProduct)
    return async () => undefined
  }
  await sweep()
  const dataDir = path.join(PARENT, String(process.pid))
  const clockOffsetMs = msToShipDay(new Date())
  const crew = makeCrew(path.join(dataDir, 'logs'))
  const tearDown = async () => {
    await crew.stopAll()
    await rm(dataDir, { recursive: true, force: true })
  }
  try {
    const product = await startProduct(crew, {
      dataDir,
      port: 0,
      clockOffsetMs,
      durable: false,
      // Not the runner's own: a server that believes to be under test would leave its guards down.
      // One proxy hop: the address that a test's browser says it comes from is believed.
      environment: { ...plainEnvironment(), LOG_LEVEL: 'warn', TRUST_PROXY_HOPS: '1' },
      onDeath: (_name, fault) => console.error(sentenceOf(fault)),
    })
    const { origin, mailOrigin, payOrigin, weatherOrigin, databaseUrl } = product
    if (!mailOrigin || !payOrigin || !weatherOrigin) throw new Error('every stand-in must run')
    project.provide('wholeProduct', {
      origin,
      mailOrigin,
      payOrigin,
      weatherOrigin,
      databaseUrl,
      clockOffsetMs,
      dataDir,
    })
  } catch (error) {
    await tearDown()
    throw error
  }
  return tearDown
}
