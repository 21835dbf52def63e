import { readFile, rm, writeFile } from 'node:fs/promises'
import path from 'node:path'

import { Fault } from './fault.mjs'
import { commandOf, stopProcess } from './mariadb-leftover.mjs'

/** @typedef {{ pid: number, command: string | null }} Running */

/** @param {string} dataDir */
const noteFile = (dataDir) => path.join(dataDir, 'running.json')

/** @param {Running} one */
const stillRuns = async (one) => one.command !== null && (await commandOf(one.pid)) === one.command

/** @param {string} dataDir @returns {Promise<{ owner: Running, origin: string, programs: Running[] } | null>} */
const readNote = (dataDir) => readFile(noteFile(dataDir), 'utf8').then(JSON.parse, () => null)

/**
 * One start a data folder. Programs of a start that was killed are ended; one that lives is not disturbed.
 * @param {string} dataDir
 */
export async function takeOver(dataDir) {
  const note = await readNote(dataDir)
  if (!note) return
  if (note.owner.pid !== process.pid && (await stillRuns(note.owner))) {
    throw new Fault(
      `Tankward already runs from this folder (process ${note.owner.pid}, ${note.origin}). Stop that one first.`,
    )
  }
  for (const program of note.programs) if (await stillRuns(program)) await stopProcess(program.pid)
  await rm(noteFile(dataDir), { force: true })
}

/** @param {string} dataDir @param {{ origin: string, pids: number[] }} now */
export async function writeNote(dataDir, { origin, pids }) {
  const running = async (/** @type {number} */ pid) => ({ pid, command: await commandOf(pid) })
  const note = {
    owner: await running(process.pid),
    origin,
    programs: await Promise.all(pids.map(running)),
  }
  await writeFile(noteFile(dataDir), JSON.stringify(note))
}

/** Leaves the note of another start alone. @param {string} dataDir */
export async function dropNote(dataDir) {
  if ((await readNote(dataDir))?.owner.pid === process.pid) await rm(noteFile(dataDir), { force: true })
}
