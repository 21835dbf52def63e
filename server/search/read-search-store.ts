import type { RowDataPacket } from 'mysql2/promise'

import { rawPool } from '@/db/client'
import { errnoOf } from '@/db/transaction'
import { Problem } from '@/shared/api/problem'

const STATEMENT_TIMEOUT = 1969

function isTooSlow(error: unknown): boolean {
  if (errnoOf(error) === STATEMENT_TIMEOUT) return true
  return error instanceof Error && 'code' in error && error.code === 'PROTOCOL_SEQUENCE_TIMEOUT'
}

/** A caller is not kept waiting longer. */
const PATIENCE_MS = 3_000

/**
 * Runs one search text (whole numbers only, see search-sql) and returns bare rows. mysql2 itself, as mapping a page
 * through the query builder costs as much as finding it.
 */
export async function readSearchRows(sql: string, patienceMs = PATIENCE_MS): Promise<number[][]> {
  // The server gives up first, so that no work goes on which nobody waits for.
  const bounded = `SET STATEMENT max_statement_time=${patienceMs / 1000} FOR ${sql}`
  try {
    const [rows] = await rawPool().query<RowDataPacket[][]>({
      sql: bounded,
      rowsAsArray: true,
      timeout: patienceMs + 500,
    })
    return rows as unknown as number[][]
  } catch (error) {
    if (!isTooSlow(error)) throw error
    throw new Problem(
      'try-again',
      'The search took too long. Make the circle smaller, or try again in a moment.',
    )
  }
}
