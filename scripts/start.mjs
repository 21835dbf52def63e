import './check-node.mjs'

import { existsSync } from 'node:fs'
import path from 'node:path'

import { makeCrew } from './crew.mjs'
import { readDemoPeople } from './demo-people.mjs'
import { sentenceOf } from './fault.mjs'
import { greeting } from './greeting.mjs'
import { DATA, ROOT } from './project-root.mjs'
import { dropNote } from './run-note.mjs'
import { readStartOptions } from './start-options.mjs'
import { startProduct } from './start-product.mjs'
import { tell } from './tell.mjs'
import { watchSources } from './watch-sources.mjs'

const settingsFile = path.join(ROOT, '.env')
if (existsSync(settingsFile)) process.loadEnvFile(settingsFile)

/** @param {ReturnType<typeof readStartOptions>} options */
async function startAndStay(options) {
  const dataDir = path.resolve(options.dataDir ?? DATA)
  const crew = makeCrew(path.join(dataDir, 'logs'))
  /** @param {number} code @param {string} [why] */
  const leave = async (code, why) => {
    if (crew.isLeaving()) return
    await crew.stopAll().catch((error) => tell(sentenceOf(error)))
    await dropNote(dataDir)
    if (why) tell(why)
    process.exit(code)
  }
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
    process.on(signal, () => {
      if (!crew.isLeaving()) tell('\nStopping …')
      void leave(0)
    })
  }
  // Whoever read our words has gone (npm start | head): go on without.
  process.stdout.on('error', () => undefined)
  process.on('uncaughtException', (error) => void leave(1, sentenceOf(error)))

  const { port, clockOffsetMs, watch } = options
  const production = process.env.NODE_ENV === 'production'
  try {
    const product = await startProduct(crew, {
      ...{ dataDir, port, clockOffsetMs, durable: true, environment: process.env },
      onDeath: (name, fault) => {
        if (watch && name === 'server') tell(`${fault.message}\nWaiting for a change …`)
        else void leave(1, fault.message)
      },
    })
    tell(greeting(product, { people: await readDemoPeople(dataDir), production, clockOffsetMs }))
    if (watch) watchSources(crew, product)
  } catch (error) {
    await leave(1, sentenceOf(error))
  }
}

try {
  await startAndStay(readStartOptions(process.argv.slice(2), process.env))
} catch (error) {
  tell(sentenceOf(error))
  process.exitCode = 1
}
