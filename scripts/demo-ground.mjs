import { access, mkdir, rm, writeFile } from 'node:fs/promises'
import path from 'node:path'

import { demoPeopleFile } from './demo-people.mjs'

/** @param {string} file */
const exists = (file) =>
  access(file).then(
    () => true,
    () => false,
  )

// Beside the database: whoever removes that folder begins anew.
/** @param {string} dataDir @param {'begun' | 'done'} when */
const markOf = (dataDir, when) => path.join(dataDir, 'mariadb', `seed-${when}`)

/** @param {string} dataDir */
export const isSeeded = (dataDir) => exists(markOf(dataDir, 'done'))

/** The first rows were begun and not finished: they cannot be finished, only begun again. @param {string} dataDir */
export const seedWasCut = async (dataDir) =>
  (await exists(markOf(dataDir, 'begun'))) && !(await isSeeded(dataDir))

/** @param {string} dataDir @param {() => Promise<void>} seed */
export async function seedAndMark(dataDir, seed) {
  await writeFile(markOf(dataDir, 'begun'), '')
  await seed()
  await writeFile(markOf(dataDir, 'done'), '')
}

/**
 * Everything of the demo that is not in the database: photos, the processor's books, mails, the list of people.
 * Marked as begun first: if this is cut short, the next start goes on clearing.
 * @param {string} dataDir
 */
export async function forgetDemo(dataDir) {
  const begun = markOf(dataDir, 'begun')
  await mkdir(path.dirname(begun), { recursive: true })
  await writeFile(begun, '')
  const folders = ['uploads', 'stripe', 'mail'].map((name) => path.join(dataDir, name))
  const gone = [markOf(dataDir, 'done'), ...folders, demoPeopleFile(dataDir)]
  for (const one of gone) await rm(one, { recursive: true, force: true })
}
