import { mysqlTable, primaryKey, int, smallint, varchar, mediumtext, bigint } from 'drizzle-orm/mysql-core'

import { instant, memberRef } from '@/db/schema/columns'

/** Answers to requests that move stock or money, kept a day so that a repeat gets the same answer. */
export const idempotencyKey = mysqlTable(
  'idempotency_key',
  {
    memberId: memberRef().notNull(),
    key: varchar({ length: 80 }).notNull(),
    endpoint: varchar({ length: 120 }).notNull(),
    fingerprint: varchar({ length: 64 }).notNull(),
    /** null while the first request is still running */
    status: smallint({ unsigned: true }),
    reply: mediumtext(),
    startedAt: instant().notNull(),
  },
  (t) => [primaryKey({ columns: [t.memberId, t.key] })],
)

/** Our own limits on costly calls: fixed windows counted in the database, so a restart forgets nothing. */
export const callCount = mysqlTable(
  'call_count',
  {
    bucket: varchar({ length: 120 }).notNull(),
    windowStart: bigint({ mode: 'number', unsigned: true }).notNull(),
    used: int({ unsigned: true }).notNull(),
  },
  (t) => [primaryKey({ columns: [t.bucket, t.windowStart] })],
)
