import type { RowDataPacket } from 'mysql2/promise'

import { rawPool } from '@/db/client'

async function handlerReads(): Promise<number> {
  const [rows] = await rawPool().query<RowDataPacket[]>("SHOW SESSION STATUS LIKE 'Handler_read%'")
  return rows.reduce((sum, row) => sum + Number(row.Value), 0)
}

/** Rows the server touched for `work`; free of noise, unlike time. Needs a pool of one connection. */
export async function rowsRead<T>(work: () => Promise<T>): Promise<{ result: T; rows: number }> {
  const before = await handlerReads()
  const result = await work()
  return { result, rows: (await handlerReads()) - before }
}
