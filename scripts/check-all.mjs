// `npm run check:all`: every check in full; one file a bar under .data/reports. `--ci`: only those .ci/run asks for.
import path from 'node:path'

import { CHECKS } from './checks.mjs'
import { makeCrew } from './crew.mjs'
import { DATA } from './project-root.mjs'
import { secondsSince, tell } from './tell.mjs'

const crew = makeCrew(path.join(DATA, 'logs'))
for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
  process.once(signal, () => void crew.stopAll().finally(() => process.exit(130)))
}
const missed = []
for (const { name, command, ci } of CHECKS) {
  if (process.argv.includes('--ci') && !ci) continue
  tell(`\n── check:${name}`)
  const began = performance.now()
  const { code } = await crew.finish({ name: `check ${name}`, command, shown: true })
  tell(
    `check:${name} ${code === 0 ? 'met its bars' : `FAILED (exit code ${code})`} in ${secondsSince(began)} s`,
  )
  if (code !== 0) missed.push(name)
}
tell(missed.length === 0 ? '\nAll checks met their bars.' : `\nNot met: ${missed.join(', ')}.`)
if (missed.length > 0) process.exitCode = 1
