import { bigint, index, int, mysqlTable, uniqueIndex, varchar } from 'drizzle-orm/mysql-core'

import { user } from '@/db/schema/auth'
import { instant, jsonOf, memberRef, publicId } from '@/db/schema/columns'
import { listing } from '@/db/schema/listings'
import { order } from '@/db/schema/orders'
import type { NoticeFacts } from '@/shared/contracts/notices'

/** What a member is told inside the product, written with the mail of the same cause. */
export const notice = mysqlTable(
  'notice',
  {
    id: bigint({ mode: 'number', unsigned: true }).autoincrement().primaryKey(),
    publicId: publicId(),
    memberId: memberRef()
      .notNull()
      .references(() => user.id, { onDelete: 'cascade' }),
    kind: varchar({ length: 24 }).notNull(),
    /** Which happening this tells of, so that it is told once: `order:42:v7`, `remind:evening-before:42:0`. */
    cause: varchar({ length: 80 }).notNull(),
    // What it is about: one of the two.
    orderId: int({ unsigned: true }).references(() => order.id),
    listingId: int({ unsigned: true }).references(() => listing.id),
    facts: jsonOf<NoticeFacts>().notNull(),
    createdAt: instant().notNull(),
    readAt: instant(),
  },
  (t) => [
    // The cause stands first: the reminders ask by cause which of them were given already.
    uniqueIndex('u_notice_cause').on(t.cause, t.memberId),
    index('k_notice_member').on(t.memberId, t.id),
    index('k_notice_unread').on(t.memberId, t.readAt),
  ],
)
