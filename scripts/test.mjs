// `npm test`: everything. `npm test -- --only unit,integration`: some.
import { parseArgs } from 'node:util'

import { sentenceOf, Fault } from './fault.mjs'
import { tell } from './tell.mjs'
import { runTiers } from './run-tiers.mjs'
import { ALL_TIERS } from './tiers.mjs'

/** @param {string | undefined} only */
function chosen(only) {
  if (only === undefined) return ALL_TIERS
  const names = only.split(',')
  const known = new Set(ALL_TIERS.map((tier) => tier.name))
  const unknown = names.filter((name) => !known.has(name))
  if (unknown.length > 0) {
    throw new Fault(`--only does not know ${unknown.join(', ')}. There are: ${[...known].join(', ')}.`)
  }
  return ALL_TIERS.filter((tier) => names.includes(tier.name))
}

try {
  const { values } = parseArgs({ options: { only: { type: 'string' } } })
  await runTiers(chosen(values.only))
} catch (error) {
  tell(sentenceOf(error))
  process.exitCode = 1
}
