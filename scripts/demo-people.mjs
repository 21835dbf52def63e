import { readFile } from 'node:fs/promises'
import path from 'node:path'

/**
 * @typedef {object} DemoPerson
 * @property {string} role
 * @property {string} email
 * @property {string} password
 * @property {string} [note]
 * @property {string} [totpSecret] base32, as in an otpauth address
 */

/** @param {string} dataDir */
export const demoPeopleFile = (dataDir) => path.join(dataDir, 'demo-people.json')

/** The invented people that the seed made; none when it has not run. @param {string} dataDir @returns {Promise<DemoPerson[]>} */
export const readDemoPeople = (dataDir) =>
  readFile(demoPeopleFile(dataDir), 'utf8').then(JSON.parse, () => [])
