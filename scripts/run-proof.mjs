// `node scripts/run-proof.mjs <name> [--slice]`: one file of tests/checks, which writes its figures itself. Each holds
// planted faults of its own and fails when it does not find them.
import { mkdir } from 'node:fs/promises'
import path from 'node:path'

import { makeCrew } from './crew.mjs'
import { exportWeb } from './export-web.mjs'
import { sentenceOf } from './fault.mjs'
import { plainEnvironment } from './plain-environment.mjs'
import { DATA } from './project-root.mjs'

const [name = ''] = process.argv.slice(2).filter((word) => !word.startsWith('--'))
const NEEDS_WEB = new Set(['headers', 'privacy'])

try {
  await mkdir(DATA, { recursive: true })
  const crew = makeCrew(path.join(DATA, 'logs'))
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
    process.once(signal, () => void crew.stopAll().finally(() => process.exit(130)))
  }
  if (NEEDS_WEB.has(name)) await exportWeb(crew)
  const { code } = await crew.finish({
    name: `proof ${name}`,
    command: ['node', 'node_modules/vitest/vitest.mjs', 'run', '--project', 'checks', `${name}.check.ts`],
    environment: {
      ...plainEnvironment(),
      CHECK_PART: process.argv.includes('--slice') ? 'slice' : 'whole',
      ...(process.env.CHECK_SEED ? { CHECK_SEED: process.env.CHECK_SEED } : {}),
    },
    graceMs: 15_000,
    shown: true,
  })
  process.exitCode = code === 0 ? 0 : 1
} catch (error) {
  console.error(sentenceOf(error))
  process.exitCode = 2
}
