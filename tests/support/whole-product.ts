import { readdir, rm } from 'node:fs/promises'
import path from 'node:path'

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
  /** Holds demo-people.json, logs and uploads of this run. */
  dataDir: string
}

declare module 'vitest' {
  interface ProvidedContext {
    wholeProduct: WholeProduct
  }
}

const PARENT = path.resolve('.data/e2e')

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
  const crew = makeCrew(path.join(dataDir, 'logs'))
  const tearDown = async () => {
    await crew.stopAll()
    await rm(dataDir, { recursive: true, force: true })
  }
  try {
    const product = await startProduct(crew, {
      dataDir,
      port: 0,
      clockOffsetMs: 0,
      durable: false,
      // Not the runner's own: a server that believes to be under test would leave its guards down.
      // One proxy hop: the address that a test's browser says it comes from is believed.
      environment: { ...plainEnvironment(), LOG_LEVEL: 'warn', TRUST_PROXY_HOPS: '1' },
      onDeath: (_name, fault) => console.error(sentenceOf(fault)),
    })
    const { origin, mailOrigin, payOrigin, weatherOrigin, databaseUrl } = product
    if (!mailOrigin || !payOrigin || !weatherOrigin) throw new Error('every stand-in must run')
    project.provide('wholeProduct', { origin, mailOrigin, payOrigin, weatherOrigin, databaseUrl, dataDir })
  } catch (error) {
    await tearDown()
    throw error
  }
  return tearDown
}
