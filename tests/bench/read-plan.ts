import type { RowDataPacket } from 'mysql2/promise'

import { rawPool } from '@/db/client'

export interface ReadPlan {
  /** Index the server goes by. */
  key: string
  /** const, ref, range, index, ALL … */
  access: string
  /** The index alone answers; no row is looked up. */
  covering: boolean
  /** Rows are sorted after reading, instead of coming in order. */
  sorted: boolean
}

/** How MariaDB would run a text that reads one table. */
export async function readPlan(sql: string): Promise<ReadPlan> {
  const [rows] = await rawPool().query<RowDataPacket[]>(`EXPLAIN ${sql}`)
  const row = rows[0]
  const extra = String(row?.Extra ?? '')
  return {
    key: String(row?.key),
    access: String(row?.type),
    covering: /Using index(?! condition)/.test(extra),
    sorted: /Using filesort/.test(extra),
  }
}
