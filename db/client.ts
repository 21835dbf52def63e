import { drizzle, type MySql2Database } from 'drizzle-orm/mysql2'
import mysql from 'mysql2/promise'

export type Database = MySql2Database<Record<string, never>>
/** Inside a transaction or outside: stores take either. */
export type Tx = Pick<
  Database,
  'select' | 'selectDistinct' | 'insert' | 'update' | 'delete' | 'execute' | '$count'
>

let pool: mysql.Pool | undefined
let database: Database | undefined

/** Opens the one pool of this process. Small on purpose: the queue in the app is cheaper than one in MariaDB. */
export function connect(url: string, connectionLimit = 12): Database {
  pool = mysql.createPool({
    uri: url,
    connectionLimit,
    timezone: 'Z',
    supportBigNumbers: true,
    // A waiting request is told "busy" by the load guard; the pool itself only queues.
    queueLimit: 0,
    connectTimeout: 3_000,
    enableKeepAlive: true,
    decimalNumbers: true,
  })
  database = drizzle(pool, { casing: 'snake_case' }) as unknown as Database
  return database
}

export function db(): Database {
  if (!database) throw new Error('connect() has not been called')
  return database
}

/** The bare mysql2 pool, for the search hot path only (drizzle's row mapping costs as much as the query). */
export function rawPool(): mysql.Pool {
  if (!pool) throw new Error('connect() has not been called')
  return pool
}

export async function disconnect(): Promise<void> {
  await pool?.end()
  pool = undefined
  database = undefined
}
