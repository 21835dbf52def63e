import path from 'node:path'

import { makeCrew } from './crew.mjs'
import { sentenceOf } from './fault.mjs'
import { DATA } from './project-root.mjs'
import { secondsSince, tell } from './tell.mjs'

/** @param {import('./crew.mjs').Crew} crew @param {import('./tiers.mjs').Tier} tier */
async function runTier(crew, tier) {
  const began = performance.now()
  tell(`\n── ${tier.name}`)
  const count = await tier.run(crew).catch((error) => {
    if (crew.isLeaving()) throw error
    tell(sentenceOf(error))
    return { passed: 0, failed: 1 }
  })
  return { ...count, name: tier.name, seconds: secondsSince(began) }
}

/**
 * Runs them one after the other (some beside those that follow), all of them even when one fails. The last line is
 * always `N passed, N failed`.
 * @param {import('./tiers.mjs').Tier[]} tiers
 */
export async function runTiers(tiers) {
  const crew = makeCrew(path.join(DATA, 'logs'))
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
    process.once(signal, () => void crew.stopAll().finally(() => process.exit(130)))
  }
  const running = []
  for (const tier of tiers) {
    const run = runTier(crew, tier)
    running.push(run)
    if (!tier.isBeside) await run
  }
  const done = await Promise.all(running)
  tell('')
  for (const { name, passed, failed, seconds } of done) {
    tell(
      `${name.padEnd(30)} ${String(passed).padStart(5)} passed ${String(failed).padStart(4)} failed ${seconds.padStart(7)} s`,
    )
  }
  const passed = done.reduce((sum, one) => sum + one.passed, 0)
  const failed = done.reduce((sum, one) => sum + one.failed, 0)
  if (failed > 0 || passed + failed === 0) process.exitCode = 1
  tell(`${passed} passed, ${failed} failed`)
}
