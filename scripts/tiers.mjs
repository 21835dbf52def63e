import { mkdir, readFile, rm, writeFile } from 'node:fs/promises'
import path from 'node:path'

import { CHECKS } from './checks.mjs'
import { countTests } from './count-tests.mjs'
import { hashFiles } from './hash-files.mjs'
import { plainEnvironment } from './plain-environment.mjs'
import { DATA, ROOT } from './project-root.mjs'
import { tell } from './tell.mjs'

/**
 * @typedef {{ passed: number, failed: number }} Count
 * @typedef {{ name: string, run: (crew: import('./crew.mjs').Crew) => Promise<Count>, isBeside?: boolean }} Tier
 *   isBeside: it keeps one core busy for long, so the tiers after it begin while it runs
 */

/** A program that either succeeds or fails: one passed or one failed. @param {string} name @param {string[]} command @returns {Tier} */
const single = (name, command) => ({
  name,
  run: async (crew) => {
    const { code } = await crew.finish({ name, command, environment: plainEnvironment(), shown: true })
    return code === 0 ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 }
  },
})

/** Expo writes the types of our addresses from the files under app/; tsc needs them. @param {import('./crew.mjs').Crew} crew */
async function writeRouteTypes(crew) {
  const stamp = path.join(DATA, 'route-types')
  const hash = await hashFiles(ROOT, ['app', 'app.json'], () => true)
  const made = await readFile(path.join(ROOT, '.expo/types/router.d.ts')).catch(() => null)
  if (made && (await readFile(stamp, 'utf8').catch(() => '')) === hash) return
  await crew.run({
    name: 'route types',
    command: ['node', 'node_modules/expo/bin/cli', 'customize', 'tsconfig.json'],
    environment: { ...plainEnvironment(), CI: '1', EXPO_NO_TELEMETRY: '1' },
  })
  await writeFile(stamp, hash)
}

const tsc = single('types', ['node', 'node_modules/typescript/bin/tsc', '--noEmit', '-p', '.'])
/** @type {Tier} */
const types = {
  name: 'types',
  run: async (crew) => {
    await mkdir(DATA, { recursive: true })
    await writeRouteTypes(crew)
    return tsc.run(crew)
  },
}

/** @param {string} name @param {string[]} [only] part of the project's files @returns {Tier} */
const vitest = (name, only = []) => ({
  name,
  run: async (crew) => {
    const report = path.join(DATA, 'test-results', `${name}.json`)
    await rm(report, { force: true })
    const command = ['node', 'node_modules/vitest/vitest.mjs', 'run', '--project', name, ...only]
    command.push('--passWithNoTests', '--reporter=default', '--reporter=json', `--outputFile.json=${report}`)
    const { code } = await crew.finish({ name, command, environment: plainEnvironment(), shown: true })
    const count = await countTests(report)
    if (count === null) return { passed: 0, failed: 1 }
    if (count.passed + count.failed === 0 && code === 0) tell(`There are no ${name} tests.`)
    // An error outside any test, or a set-up that failed: vitest ends badly though no test did.
    return code !== 0 && count.failed === 0 ? { ...count, failed: 1 } : count
  },
})

/** A check is worth something only if it notices the fault it is there for. @param {import('./checks.mjs').Check} check @returns {Tier[]} */
const slices = ({ name, sliceCommand, faultCommand }) => {
  const slice = single(`check:${name}`, sliceCommand)
  if (!faultCommand) return [slice]
  const planted = `check:${name} planted fault`
  const notices = {
    name: planted,
    run: async (/** @type {import('./crew.mjs').Crew} */ crew) => {
      const { code } = await crew.finish({
        name: planted,
        command: faultCommand,
        environment: plainEnvironment(),
      })
      if (code === 1) return { passed: 1, failed: 0 }
      tell(`check:${name} does not notice its planted fault (exit code ${code}).`)
      return { passed: 0, failed: 1 }
    },
  }
  return [slice, notices]
}

/** Without a database, at most 90 seconds. */
export const QUICK_TIERS = [
  types,
  single('routes', ['node', 'scripts/write-routes.mjs', '--check']),
  {
    ...single('lint', ['node', 'node_modules/eslint/bin/eslint.js', '.', '--max-warnings', '0']),
    isBeside: true,
  },
  vitest('unit'),
  vitest('reference'),
]

/** In the order in which they tell most for their time. */
export const ALL_TIERS = [
  ...QUICK_TIERS.slice(0, 3),
  single('format', ['node', 'node_modules/prettier/bin/prettier.cjs', '--check', '--log-level', 'warn', '.']),
  ...QUICK_TIERS.slice(3),
  vitest('integration'),
  vitest('e2e'),
  ...CHECKS.flatMap(slices),
]
