import path from 'node:path'

/** A failure that the person at the keyboard can mend: its message is the whole story. */
export class MariadbFault extends Error {
  /** @param {string} message */
  constructor(message) {
    super(message)
    this.name = 'MariadbFault'
  }
}

export const INSTALL_HINT =
  'Install MariaDB 10.11 or newer (Debian or Ubuntu: sudo apt-get install mariadb-server-core mariadb-client-core; macOS: brew install mariadb) and start again.'

/**
 * What the log of a server that will not start means, in a sentence that says what to do; null when unknown.
 * @param {string} log @param {string} dir
 */
export function explain(log, dir) {
  if (/No space left|Errcode: 28|ENOSPC|error (?:number )?28\b|disk is full/i.test(log)) {
    return `The disk that holds ${dir} is full. Make room (about 300 MB) and start again; nothing stored is lost.`
  }
  if (/EACCES|Permission denied|Errcode: 13|EROFS|Read-only file system/i.test(log)) {
    return `${dir} may not be written by this user. Give it to the user who starts the program, or start from another folder.`
  }
  if (/Unable to lock .*ibdata1|Can't lock aria control file/i.test(log)) {
    return `Another database server is using ${dir}. Stop it and start again.`
  }
  if (/unknown (?:variable|option)/i.test(log)) {
    return `This MariaDB does not know an option we need: ${/unknown .*/i.exec(log)?.[0] ?? ''}. ${INSTALL_HINT}`
  }
  if (
    /corrupt|Missing FILE_CHECKPOINT|Upgrade after a crash|Plugin 'InnoDB' .*failed|tablespace .* is missing/i.test(
      log,
    )
  ) {
    return `The database in ${path.join(dir, 'data')} is damaged or comes from another MariaDB version. Restore it, or move the folder ${dir} away to begin empty. The server's own words are in ${path.join(dir, 'error.log')}.`
  }
  return null
}
