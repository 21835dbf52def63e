import { readFileSync } from 'node:fs'

import { and, isNull, lt, sql } from 'drizzle-orm'

import { db } from '@/db/client'
import { outbox } from '@/db/schema/outbox'
import { countCall } from '@/server/http/call-limit-store'

interface Journal {
  entries: unknown[]
}

const JOURNAL = new URL('../../db/migrations/meta/_journal.json', import.meta.url)
let known: number | undefined

/** Writes one row: a database that only reads cannot serve. Answers within the pool's time-out or throws. */
export async function touchDatabase(): Promise<void> {
  await countCall('ready', 0)
}

/** Whether every migration this code was written for has been applied. */
export async function hasMigrations(): Promise<boolean> {
  known ??= (JSON.parse(readFileSync(JOURNAL, 'utf8')) as Journal).entries.length
  const [rows] = await db().execute(sql`select count(*) as applied from __drizzle_migrations`)
  const [row] = rows as unknown as { applied: number }[]
  return Number(row?.applied ?? 0) >= known
}

export async function countLateEffects(before: Date): Promise<number> {
  return db().$count(outbox, and(isNull(outbox.doneAt), isNull(outbox.deadAt), lt(outbox.createdAt, before)))
}
