import { bigint, index, mysqlTable, varchar } from 'drizzle-orm/mysql-core'

import { instant, jsonOf, memberRef } from '@/db/schema/columns'

/** Every act of staff and every refusal of access, append-only. */
export const auditLog = mysqlTable(
  'audit_log',
  {
    id: bigint({ mode: 'number', unsigned: true }).autoincrement().primaryKey(),
    actorId: memberRef(),
    act: varchar({ length: 48 }).notNull(),
    subject: varchar({ length: 80 }).notNull(),
    facts: jsonOf<Record<string, unknown>>().notNull(),
    at: instant().notNull(),
  },
  (t) => [index('k_audit_subject').on(t.subject, t.id), index('k_audit_actor').on(t.actorId, t.id)],
)
