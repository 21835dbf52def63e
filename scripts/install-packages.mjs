import { statfs } from 'node:fs/promises'
import path from 'node:path'

import { Fault } from './fault.mjs'
import { packagesAreCurrent } from './packages-are-current.mjs'
import { ROOT } from './project-root.mjs'
import { step, tell } from './tell.mjs'

// Measured: 1.1 GB unpacked, and npm's own cache beside it.
const NEEDED_BYTES = 1.5e9

/** npm tells its scripts where it is; by hand, the one beside this Node will do. */
function npmCommand() {
  const told = process.env.npm_execpath
  return told?.endsWith('.js') ? ['node', told] : [path.join(path.dirname(process.execPath), 'npm')]
}

/** Brings node_modules in step with the lock, also after an installation that was cut short. @param {import('./crew.mjs').Crew} crew */
export async function installPackages(crew) {
  if (await packagesAreCurrent(ROOT)) return
  const { bavail, bsize } = await statfs(ROOT)
  if (bavail * bsize < NEEDED_BYTES) {
    const free = (bavail * bsize) / 1e9
    throw new Fault(
      `The disk has ${free.toFixed(1)} GB free, but the packages need about 1.5 GB. Make room and run the same command again.`,
    )
  }
  tell('Packages are missing or out of step with package-lock.json: installing them (about 1 to 2 minutes).')
  await step('Installing packages', () =>
    crew.run({
      // Without --include=dev a production environment would leave out what builds the web app.
      name: 'npm ci',
      command: [...npmCommand(), 'ci', '--include=dev', '--no-audit', '--no-fund'],
    }),
  )
}
