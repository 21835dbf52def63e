import mysql from 'mysql2/promise'

// What was once written there is never changed, not even by a fault of ours.
const ADD_ONLY = new Set(['ledger_group', 'ledger_entry', 'audit_log'])
// Changed and hidden, but there for good: no rating goes because somebody dislikes it.
const KEPT = new Set(['rating', 'survival'])
const READ_ONLY = new Set(['__drizzle_migrations'])
const APP = "'tankward_app'@'127.0.0.1'"

/** @param {string} table */
function rightsOn(table) {
  if (READ_ONLY.has(table)) return 'SELECT'
  if (KEPT.has(table)) return 'SELECT, INSERT, UPDATE'
  return ADD_ONLY.has(table) ? 'SELECT, INSERT' : 'SELECT, INSERT, UPDATE, DELETE'
}

/**
 * Replaces the app user's rights on the whole database by rights a table, so that ledger and audit rows can only
 * be added. MariaDB has no "all but these tables"; run it after the migrations, which may bring new tables.
 * @param {import('./mariadb.mjs').Mariadb} server @param {string} database
 */
export async function narrowRights(server, database) {
  // Root has no network door: the socket, and the same system user that made the folder.
  const root = await mysql.createConnection({ socketPath: server.socket, user: 'root' })
  try {
    const [rows] = await root.query(
      "SELECT table_name AS name FROM information_schema.tables WHERE table_schema = ? AND table_type = 'BASE TABLE'",
      [database],
    )
    const tables = /** @type {{ name: string }[]} */ (rows).map((row) => row.name)
    await root.query(`REVOKE ALL PRIVILEGES, GRANT OPTION FROM ${APP}`)
    for (const table of tables)
      await root.query(`GRANT ${rightsOn(table)} ON ??.?? TO ${APP}`, [database, table])
  } finally {
    await root.end()
  }
}
