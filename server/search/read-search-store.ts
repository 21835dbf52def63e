import type { RowDataPacket } from 'mysql2/promise'

import { rawPool } from '@/db/client'

/** A caller is not kept waiting longer; the server drops the work a moment later. */
const PATIENCE_MS = 3_000

/**
 * Runs one search text (whole numbers only, see search-sql) and returns bare rows. mysql2 itself, as mapping a page
 * through the query builder costs as much as finding it.
 */
export async function readSearchRows(sql: string, patienceMs = PATIENCE_MS): Promise<number[][]> {
  const [rows] = await rawPool().query<RowDataPacket[][]>({ sql, rowsAsArray: true, timeout: patienceMs })
  return rows as unknown as number[][]
}
