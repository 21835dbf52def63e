import { sql } from 'drizzle-orm'
import { check, index, int, mysqlTable, tinyint, varchar } from 'drizzle-orm/mysql-core'

import { instant, memberRef, publicId } from '@/db/schema/columns'
import { order } from '@/db/schema/orders'
import { seller } from '@/db/schema/sellers'

const mark = () => tinyint({ unsigned: true }).notNull()
const ofOrder = () =>
  int({ unsigned: true })
    .notNull()
    .references(() => order.id)
const ofSeller = () =>
  int({ unsigned: true })
    .notNull()
    .references(() => seller.id)

/** A buyer's marks for an order that was handed over. No row is ever deleted; a moderator hides words alone. */
export const rating = mysqlTable(
  'rating',
  {
    id: int({ unsigned: true }).autoincrement().primaryKey(),
    publicId: publicId(),
    orderId: ofOrder().unique(),
    sellerId: ofSeller(),
    buyerId: memberRef().notNull(),
    fishMark: mark(),
    countMark: mark(),
    contactMark: mark(),
    words: varchar({ length: 600 }).notNull().default(''),
    wordsHidden: varchar({ length: 24 }),
    reply: varchar({ length: 600 }),
    replyHidden: varchar({ length: 24 }),
    repliedAt: instant(),
    createdAt: instant().notNull(),
    editedAt: instant(),
  },
  (t) => [
    index('k_rating_seller').on(t.sellerId, t.id),
    check(
      'marks_are_1_to_5',
      sql`${t.fishMark} between 1 and 5 and ${t.countMark} between 1 and 5 and ${t.contactMark} between 1 and 5`,
    ),
  ],
)

/** How many of the animals of one order lived on day 7: a row from the hand-over on, asked once, answered by the buyer. */
export const survival = mysqlTable(
  'survival',
  {
    orderId: ofOrder().primaryKey(),
    sellerId: ofSeller(),
    handedOver: int({ unsigned: true }).notNull(),
    dueAt: instant().notNull(),
    askedAt: instant(),
    alive: int({ unsigned: true }),
    answeredAt: instant(),
    correctedAt: instant(),
  },
  (t) => [
    index('k_survival_due').on(t.askedAt, t.dueAt),
    index('k_survival_seller').on(t.sellerId),
    check('no_more_alive_than_handed_over', sql`${t.alive} is null or ${t.alive} <= ${t.handedOver}`),
  ],
)
