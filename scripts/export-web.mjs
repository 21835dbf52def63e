import { readFile, rename, rm, writeFile } from 'node:fs/promises'
import path from 'node:path'

import { hashFiles } from './hash-files.mjs'
import { precompress } from './precompress.mjs'
import { DATA, ROOT } from './project-root.mjs'
import { plainEnvironment } from './plain-environment.mjs'

/** What the exported app is made of. */
export const WEB_INPUTS = [
  ...['app', 'components', 'hooks', 'constants', 'shared', 'assets', 'public'],
  ...['app.json', 'metro.config.js', 'package.json', 'package-lock.json', 'tsconfig.json'],
]
const STAMP = '.made-from'

/** @param {string} file relative to the root */
const counts = (file) =>
  !file.startsWith(path.join('assets', 'data') + path.sep) && !/\.test\.tsx?$/.test(file)

export const hashOfWeb = () => hashFiles(ROOT, WEB_INPUTS, counts)

/** @param {string} folder */
const stampOf = (folder) => readFile(path.join(folder, STAMP), 'utf8').catch(() => null)

/**
 * Exports the web app into `folder` unless it already is what the sources make. A half-made export never
 * appears under its final name.
 * @param {import('./crew.mjs').Crew} crew @param {string} [folder]
 * @returns {Promise<boolean>} whether anything was made
 */
export async function exportWeb(crew, folder = path.join(ROOT, 'dist')) {
  const hash = await hashOfWeb()
  if ((await stampOf(folder)) === hash) return false
  const half = path.join(DATA, `web-${process.pid}`)
  const old = `${half}-old`
  try {
    await crew.run({
      name: 'web export',
      command: ['node', 'node_modules/expo/bin/cli', 'export', '-p', 'web', '--output-dir', half],
      environment: { ...plainEnvironment(), CI: '1', EXPO_NO_TELEMETRY: '1', NODE_ENV: 'production' },
    })
    await rm(path.join(half, 'metadata.json'), { force: true })
    await precompress(half)
    await writeFile(path.join(half, STAMP), hash)
    await rename(folder, old).catch((error) => {
      if (error.code !== 'ENOENT') throw error
    })
    await rename(half, folder)
  } finally {
    await Promise.all([half, old].map((one) => rm(one, { recursive: true, force: true })))
  }
  return true
}
