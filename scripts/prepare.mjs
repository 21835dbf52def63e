// Runs before `npm start` and `npm test`, on a fresh clone too: plain Node, no packages.
import './check-node.mjs'

import path from 'node:path'

import { makeCrew } from './crew.mjs'
import { sentenceOf } from './fault.mjs'
import { installPackages } from './install-packages.mjs'
import { installPrograms } from './install-programs.mjs'
import { DATA } from './project-root.mjs'
import { tell } from './tell.mjs'

const crew = makeCrew(path.join(DATA, 'logs'))
for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
  process.once(signal, () => crew.stopAll().finally(() => process.exit(1)))
}
try {
  await installPrograms(crew, { forTests: process.argv[2] === 'test' })
  await installPackages(crew)
} catch (error) {
  if (!crew.isLeaving()) tell(sentenceOf(error))
  process.exitCode = 1
}
