import { lt, sql } from 'drizzle-orm'

import { db } from '@/db/client'
import { callCount } from '@/db/schema/requests'

/** Adds one to the bucket and returns the count with it: one statement, so two processes cannot both be first. */
export async function countCall(bucket: string, windowStart: number): Promise<number> {
  const [rows] = await db().execute(
    sql`insert into call_count (bucket, window_start, used) values (${bucket}, ${windowStart}, 1)
        on duplicate key update used = used + 1 returning used`,
  )
  const [row] = rows as unknown as { used: number }[]
  return row?.used ?? 1
}

export async function dropOldCounts(beforeS: number): Promise<void> {
  await db().delete(callCount).where(lt(callCount.windowStart, beforeS))
}
