import { execFile } from 'node:child_process'
import { mkdir, writeFile } from 'node:fs/promises'
import path from 'node:path'
import { promisify } from 'node:util'

import { DATA, ROOT } from './project-root.mjs'

export const REPORTS = path.join(DATA, 'reports')

/** @returns {Promise<string | null>} null outside a git clone */
const commit = () =>
  promisify(execFile)('git', ['rev-parse', 'HEAD'], { cwd: ROOT }).then(
    ({ stdout }) => stdout.trim(),
    () => null,
  )

/**
 * One measured figure beside its bar, as .data/reports/<id>.json, and one line for people.
 * @param {{ id: string, figure: number | string, bar: number | string, pass: boolean, seed?: number | string }} measured
 */
export async function writeReport({ id, figure, bar, pass, seed }) {
  await mkdir(REPORTS, { recursive: true })
  const report = { id, figure, bar, pass, seed: seed ?? null, commit: await commit() }
  await writeFile(path.join(REPORTS, `${id}.json`), `${JSON.stringify(report, null, 2)}\n`)
  console.log(`${pass ? 'met' : 'MISSED'}  ${id}: ${figure} (bar: ${bar})`)
}
