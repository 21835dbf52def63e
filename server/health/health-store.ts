import { and, isNull, lt, sql } from 'drizzle-orm'

import { db } from '@/db/client'
import { outbox } from '@/db/schema/outbox'

/** Answers within the pool's time-out or throws. */
export async function touchDatabase(): Promise<void> {
  await db().execute(sql`select 1`)
}

export async function countLateEffects(before: Date): Promise<number> {
  return db().$count(outbox, and(isNull(outbox.doneAt), isNull(outbox.deadAt), lt(outbox.createdAt, before)))
}
