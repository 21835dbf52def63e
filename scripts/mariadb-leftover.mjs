import { execFile } from 'node:child_process'
import { readdir, readFile, rm, writeFile } from 'node:fs/promises'
import path from 'node:path'
import { promisify } from 'node:util'

import { MariadbFault } from './mariadb-fault.mjs'

const run = promisify(execFile)
const STOP_WITHIN_MS = 60_000

/** @param {number} ms */
export const pause = (ms) => new Promise((done) => setTimeout(done, ms))

/** @param {number} pid */
function isAlive(pid) {
  try {
    process.kill(pid, 0)
    return true
  } catch (error) {
    return error instanceof Error && 'code' in error && error.code === 'EPERM'
  }
}

/** What a process was started with; null when it is gone. Guards against a number that was given out again. */
export async function commandOf(/** @type {number} */ pid) {
  if (!isAlive(pid)) return null
  const proc = await readFile(`/proc/${pid}/cmdline`, 'utf8').catch(() => null)
  if (proc !== null) return proc === '' ? null : proc.replaceAll('\0', ' ')
  return run('ps', ['-o', 'command=', '-p', String(pid)]).then(
    ({ stdout }) => stdout.trim() || null,
    () => null,
  )
}

/** SIGTERM, then waits until the data is closed. Never SIGKILL: that is for the person to decide. @param {number} pid */
export async function stopProcess(pid) {
  if (isAlive(pid)) process.kill(pid, 'SIGTERM')
  const until = Date.now() + STOP_WITHIN_MS
  // Our own child stays a zombie until Node has reaped it, so its command line is asked for as well.
  while ((await commandOf(pid)) !== null) {
    if (Date.now() > until)
      throw new MariadbFault(`The database server (process ${pid}) does not stop. Stop it by hand.`)
    await pause(20)
  }
}

const noteIn = (/** @type {string} */ dir) => path.join(dir, 'running.json')

/** Says which server runs in `dir` and who started it. @param {string} dir @param {{ pid: number, socket: string }} server */
export async function writeNote(dir, server) {
  const ownerCommand = await commandOf(process.pid)
  await writeFile(noteIn(dir), JSON.stringify({ ...server, owner: process.pid, ownerCommand }))
}

/** @param {string} dir */
export const removeNote = (dir) => rm(noteIn(dir), { force: true })

/** @param {string} note @returns {Promise<{ pid: number, socket: string, owner: number, ownerCommand: string } | null>} */
async function readNote(note) {
  try {
    return JSON.parse(await readFile(note, 'utf8'))
  } catch {
    // Absent, or cut short by a full disk. A server that still runs then holds its lock and says so.
    return null
  }
}

/**
 * A server may have outlived the program that started it. Ends it, or refuses when that program still runs.
 * @param {string} dir
 */
export async function stopLeftover(dir) {
  const left = await readNote(noteIn(dir))
  if (!left) return
  const command = await commandOf(left.pid)
  if (command?.includes(`--datadir=${path.join(dir, 'data')}`)) {
    const ownerLives = (await commandOf(left.owner)) === left.ownerCommand
    if (ownerLives && left.owner !== process.pid) {
      throw new MariadbFault(
        `This database is in use by process ${left.owner}, which is still running. Stop that one first.`,
      )
    }
    await stopProcess(left.pid)
  }
  const socketFolder = path.dirname(left.socket)
  if (path.basename(socketFolder).startsWith('tw-')) await rm(socketFolder, { recursive: true, force: true })
  await removeNote(dir)
}

/** Stops and removes every server folder under `parent` whose starter is gone (killed test runs). @param {string} parent */
export async function sweepLeftovers(parent) {
  for (const name of await readdir(parent).catch(() => [])) {
    const dir = path.join(parent, name)
    try {
      await stopLeftover(dir)
    } catch (error) {
      if (error instanceof MariadbFault) continue
      throw error
    }
    const [, starter] = /-(\d+)$/.exec(name) ?? []
    if (!starter || !isAlive(Number(starter))) await rm(dir, { recursive: true, force: true })
  }
}
