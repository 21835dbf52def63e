// `npm run check`: what needs no database, while the change is still fresh.
import './check-node.mjs'

import path from 'node:path'

import { makeCrew } from './crew.mjs'
import { sentenceOf } from './fault.mjs'
import { installPackages } from './install-packages.mjs'
import { DATA } from './project-root.mjs'
import { runTiers } from './run-tiers.mjs'
import { tell } from './tell.mjs'
import { QUICK_TIERS } from './tiers.mjs'

try {
  await installPackages(makeCrew(path.join(DATA, 'logs')))
  await runTiers(QUICK_TIERS)
} catch (error) {
  tell(sentenceOf(error))
  process.exitCode = 1
}
