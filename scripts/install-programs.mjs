import { explainFailure } from './explain-failure.mjs'
import { Fault } from './fault.mjs'
import { findChromium, findProgram } from './find-program.mjs'
import { findServer } from './mariadb-folder.mjs'
import { step, tell } from './tell.mjs'

const WAIT_FOR_OTHERS = ['-o', 'DPkg::Lock::Timeout=120', '-o', 'Acquire::Retries=2']

/** @param {boolean} forTests @returns {Promise<string[]>} Debian's names of the packages that are not there yet */
async function missingPackages(forTests) {
  const server =
    (await findProgram(['mariadbd', 'mysqld'])) &&
    (await findProgram(['mariadb-install-db', 'mysql_install_db']))
  const missing = server ? [] : ['mariadb-server-core', 'mariadb-client-core']
  if (forTests && !(await findChromium())) missing.push('chromium')
  return missing
}

/** @param {string[]} packages */
function askForHelp(packages) {
  const names = packages.join(' ')
  return new Fault(
    process.platform === 'darwin'
      ? `Missing on this machine: ${names}. Install MariaDB 10.11 or newer and Chromium (brew install mariadb chromium), then run the same command again.`
      : `Missing on this machine: ${names}. Run this once, then the same command again:\n  sudo apt-get update && sudo apt-get install -y --no-install-recommends ${names}`,
  )
}

/**
 * MariaDB's server (and Chromium for the tests): found, or installed where we may. Only the two core packages:
 * they bring no service and no data folder of the system's.
 * @param {import('./crew.mjs').Crew} crew @param {{ forTests: boolean }} wanted
 */
export async function installPrograms(crew, { forTests }) {
  const missing = await missingPackages(forTests)
  if (missing.length > 0) {
    const apt = await findProgram(['apt-get'])
    if (!apt || process.getuid?.() !== 0) throw askForHelp(missing)
    tell(`Installing ${missing.join(', ')} with apt-get.`)
    const environment = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' }
    await step('Reading the package lists', () =>
      crew.run({ name: 'apt-get update', command: [apt, 'update', ...WAIT_FOR_OTHERS], environment }),
    )
    const install = [apt, 'install', '-y', '--no-install-recommends', ...WAIT_FOR_OTHERS, ...missing]
    await step(`Installing ${missing.join(', ')}`, () =>
      crew.run({ name: 'apt-get install', command: install, environment }),
    ).catch(async (error) => {
      // Without a network the update only warns, and then every package is unknown.
      const before = explainFailure(await crew.wordsOf('apt-get update'))
      throw before ? new Fault(before) : error
    })
    const still = await missingPackages(forTests)
    if (still.length > 0) throw askForHelp(still)
  }
  // Says so in a sentence when the server that is there is too old.
  await findServer()
}
