import { execFile } from 'node:child_process'
import { constants } from 'node:fs'
import { access, mkdir, rename, rm } from 'node:fs/promises'
import { userInfo } from 'node:os'
import path from 'node:path'
import { promisify } from 'node:util'

import { explain, INSTALL_HINT, MariadbFault } from './mariadb-fault.mjs'

const run = promisify(execFile)

// Earlier servers lack innodb_snapshot_isolation, on which the order transactions rely.
const OLDEST = [10, 11, 8]

/** @param {string[]} names */
async function findProgram(names) {
  const folders = [
    ...(process.env.PATH ?? '').split(path.delimiter),
    '/usr/sbin',
    '/usr/bin',
    '/usr/local/bin',
  ]
  for (const name of names) {
    for (const folder of folders.filter(Boolean)) {
      const file = path.join(folder, name)
      if (await exists(file, constants.X_OK)) return file
    }
  }
  throw new MariadbFault(`The program ${names[0]} was not found on this machine. ${INSTALL_HINT}`)
}

/** @param {string} file @param {number} [mode] */
async function exists(file, mode = constants.F_OK) {
  return access(file, mode).then(
    () => true,
    () => false,
  )
}

export async function findServer() {
  const server = await findProgram(['mariadbd', 'mysqld'])
  const { stdout } = await run(server, ['--no-defaults', '--version'])
  const found = /Ver (\d+)\.(\d+)\.(\d+)-MariaDB/.exec(stdout)
  const version = found?.slice(1).map(Number) ?? []
  const age = OLDEST.map((part, i) => (version[i] ?? 0) - part).find((gap) => gap !== 0) ?? 0
  if (!found || age < 0) {
    throw new MariadbFault(
      `${server} is "${stdout.trim()}", but ${OLDEST.join('.')} or newer of MariaDB is needed. ${INSTALL_HINT}`,
    )
  }
  return server
}

/** MariaDB refuses to run as root unless told so; giving the files to another user would lock out the owner. */
export const asRoot = () => (process.getuid?.() === 0 ? [`--user=${userInfo().username}`] : [])

/**
 * Makes `dir` a server folder when it is not one yet. A half-made one never appears under its final name.
 * @param {string} dir
 * @param {{ smallLog?: boolean }} [shape] smallLog: 26 MB instead of 114 MB on disk, for throw-away servers
 */
export async function initDataDir(dir, shape = {}) {
  const data = path.join(dir, 'data')
  if (await exists(path.join(data, 'mysql'))) return
  if (await exists(data)) {
    throw new MariadbFault(
      `${data} exists but is not a complete database folder. Move it away and start again.`,
    )
  }
  const install = await findProgram(['mariadb-install-db', 'mysql_install_db'])
  const half = path.join(dir, `data.new-${process.pid}`)
  try {
    await mkdir(half, { recursive: true })
    const flags = ['--no-defaults', `--datadir=${half}`, '--skip-test-db', '--skip-name-resolve']
    flags.push('--auth-root-authentication-method=socket', `--auth-root-socket-user=${userInfo().username}`)
    if (shape.smallLog) flags.push('--innodb-log-file-size=8M')
    await run(install, [...flags, ...asRoot()], { maxBuffer: 1 << 24 })
    await rename(half, data)
  } catch (error) {
    await rm(half, { recursive: true, force: true })
    const told =
      error instanceof Error ? `${error.message}\n${'stderr' in error ? error.stderr : ''}` : String(error)
    throw new MariadbFault(
      explain(told, dir) ?? `The database folder ${data} could not be made: ${told.trim()}`,
    )
  }
}
