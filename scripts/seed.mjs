// `npm run seed -- --date 2027-01-15`: throws the demo data away and makes it anew, as of that day or of today.
// With DATABASE_URL in the environment: adds what a new installation needs there, and throws nothing away.
import './check-node.mjs'

import path from 'node:path'

import { makeCrew } from './crew.mjs'
import { Fault, sentenceOf } from './fault.mjs'
import { claimGround, layGround } from './lay-ground.mjs'
import { DATA } from './project-root.mjs'
import { dropNote } from './run-note.mjs'
import { readStartOptions } from './start-options.mjs'
import { tell } from './tell.mjs'

/** @param {import('./crew.mjs').Crew} crew @param {string} dataDir @param {number} clockOffsetMs */
async function startOver(crew, dataDir, clockOffsetMs) {
  if (process.env.NODE_ENV === 'production') {
    throw new Fault('This would throw away every row. In production, name the database in DATABASE_URL.')
  }
  const { port, origin } = await claimGround(dataDir, 0)
  const environment = process.env
  await layGround(crew, { dataDir, port, origin, clockOffsetMs, durable: true, environment, startOver: true })
}

const { clockOffsetMs, dataDir: named } = readStartOptions(process.argv.slice(2), process.env)
const dataDir = path.resolve(named ?? DATA)
const crew = makeCrew(path.join(dataDir, 'logs'))
for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
  process.once(signal, () => void crew.stopAll().finally(() => process.exit(130)))
}
try {
  if (process.env.DATABASE_URL) {
    const command = ['node', '--import', 'tsx', 'seed/run.ts']
    const { code } = await crew.finish({ name: 'seed', command, shown: true })
    if (code !== 0) process.exitCode = 1
  } else {
    await startOver(crew, dataDir, clockOffsetMs)
    tell('The demo data is new. Start with the same --date to see it as of that day.')
  }
} catch (error) {
  if (!crew.isLeaving()) tell(sentenceOf(error))
  process.exitCode = 1
} finally {
  await crew.stopAll()
  await dropNote(dataDir)
}
