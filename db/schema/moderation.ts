import { bigint, index, int, mysqlTable, text, tinyint, uniqueIndex, varchar } from 'drizzle-orm/mysql-core'

import { user } from '@/db/schema/auth'
import { instant, jsonOf, memberRef } from '@/db/schema/columns'
import { listing } from '@/db/schema/listings'

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

/** What members say is wrong with a listing. The seller never learns who. */
export const listingReport = mysqlTable(
  'listing_report',
  {
    id: int({ unsigned: true }).autoincrement().primaryKey(),
    listingId: int({ unsigned: true })
      .notNull()
      .references(() => listing.id),
    reporterId: memberRef()
      .notNull()
      .references(() => user.id, { onDelete: 'cascade' }),
    reason: varchar({ length: 24 }).notNull(),
    words: text(),
    createdAt: instant().notNull(),
    /** 1 while it waits, null once it is closed: so the unique key holds one open report of a member and listing. */
    open: tinyint().default(1),
    /** nothing-wrong | taken-down */
    outcome: varchar({ length: 16 }),
    /** Why the listing went off sale. */
    closingReason: varchar({ length: 32 }),
    note: text(),
    closedAt: instant(),
    closedBy: memberRef(),
  },
  (t) => [
    uniqueIndex('u_listing_report_open').on(t.listingId, t.reporterId, t.open),
    index('k_listing_report_open').on(t.open, t.listingId, t.id),
  ],
)
