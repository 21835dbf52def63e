import { randomBytes } from 'node:crypto'
import { readFile, rename, writeFile } from 'node:fs/promises'
import path from 'node:path'

/** @typedef {{ auth: string, stripeKey: string, stripeWebhook: string }} Secrets */

/** Made once a data folder, readable by its owner only. @param {string} dataDir @returns {Promise<Secrets>} */
export async function readSecrets(dataDir) {
  const file = path.join(dataDir, 'secrets.json')
  const kept = await readFile(file, 'utf8').then(JSON.parse, () => null)
  if (kept?.auth && kept.stripeKey && kept.stripeWebhook) return kept
  const secret = () => randomBytes(24).toString('hex')
  const made = { auth: secret(), stripeKey: `sk_test_${secret()}`, stripeWebhook: `whsec_${secret()}` }
  await writeFile(`${file}.new`, JSON.stringify(made), { mode: 0o600 })
  await rename(`${file}.new`, file)
  return made
}
