import { bigint, index, mysqlTable, smallint, text, varchar } from 'drizzle-orm/mysql-core'

import { instant, jsonOf } from '@/db/schema/columns'

/**
 * Effects outside the database (mail, capture, refund, transfer …), written with the change that causes them and
 * done after it commits. The row's number is the idempotency key of the effect.
 */
export const outbox = mysqlTable(
  'outbox',
  {
    seq: bigint({ mode: 'number', unsigned: true }).autoincrement().primaryKey(),
    kind: varchar({ length: 32 }).notNull(),
    ref: bigint({ mode: 'number', unsigned: true }).notNull(),
    body: jsonOf<Record<string, unknown>>().notNull(),
    createdAt: instant().notNull(),
    /** Real time: retries must go on when the demo's date stands still. */
    runAfter: instant().notNull(),
    attempts: smallint({ unsigned: true }).notNull().default(0),
    doneAt: instant(),
    /** Given up after its last try: the stuck list shows it. */
    deadAt: instant(),
    lastError: text(),
  },
  (t) => [
    index('k_outbox_waiting').on(t.doneAt, t.deadAt, t.runAfter),
    index('k_outbox_ref').on(t.kind, t.ref),
  ],
)
