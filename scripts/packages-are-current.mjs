import { existsSync } from 'node:fs'
import { readFile } from 'node:fs/promises'
import path from 'node:path'

/** @param {string} file @returns {Promise<Record<string, { version?: string, integrity?: string, optional?: boolean }> | null>} */
async function packagesOf(file) {
  try {
    return JSON.parse(await readFile(file, 'utf8')).packages
  } catch {
    return null
  }
}

/**
 * Whether node_modules holds exactly what package-lock.json asks for. npm writes its own list last, so an
 * installation that was cut short has none; a package whose folder was emptied since is noticed too.
 * @param {string} root
 */
export async function packagesAreCurrent(root) {
  const wanted = await packagesOf(path.join(root, 'package-lock.json'))
  const present = await packagesOf(path.join(root, 'node_modules', '.package-lock.json'))
  if (!wanted || !present) return false
  const asAsked = Object.entries(wanted).every(([name, { version, integrity, optional }]) => {
    const here = present[name]
    // Optional packages are for one system each: the others' are rightly absent.
    if (!here) return name === '' || optional === true
    return here.version === version && here.integrity === integrity
  })
  return asAsked && Object.keys(present).every((name) => existsSync(path.join(root, name, 'package.json')))
}
