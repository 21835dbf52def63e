import { createHash } from 'node:crypto'
import { readdir, readFile } from 'node:fs/promises'
import path from 'node:path'

/** @param {string} place @param {(file: string) => boolean} counts @returns {Promise<string[]>} */
async function filesUnder(place, counts) {
  const entries = await readdir(place, { withFileTypes: true, recursive: true }).catch((error) => {
    if (error.code === 'ENOTDIR') return null
    if (error.code === 'ENOENT') return []
    throw error
  })
  if (entries === null) return [place]
  return entries
    .filter((entry) => entry.isFile())
    .map((entry) => path.join(entry.parentPath, entry.name))
    .filter(counts)
}

/**
 * One hash over names and contents. Files and folders that do not exist count as empty.
 * @param {string} root @param {string[]} places relative to root
 * @param {(file: string) => boolean} counts takes the path relative to root
 */
export async function hashFiles(root, places, counts) {
  const lists = await Promise.all(
    places.map((place) => filesUnder(path.join(root, place), (file) => counts(path.relative(root, file)))),
  )
  const hash = createHash('sha256')
  for (const file of lists.flat().sort()) {
    const bytes = await readFile(file).catch(() => null)
    if (bytes) hash.update(`${path.relative(root, file)}\0${bytes.length}\0`).update(bytes)
  }
  return hash.digest('hex')
}
