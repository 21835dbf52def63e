import { boolean, double, index, int, mysqlTable, text, varchar } from 'drizzle-orm/mysql-core'

import { user } from '@/db/schema/auth'
import { instant, jsonOf, memberRef, publicId } from '@/db/schema/columns'
import type { LicenceAnswer } from '@/shared/contracts/sellers'

export const seller = mysqlTable(
  'seller',
  {
    id: int({ unsigned: true }).autoincrement().primaryKey(),
    publicId: publicId(),
    memberId: memberRef()
      .notNull()
      .unique()
      .references(() => user.id),
    farmName: varchar({ length: 80 }).notNull(),
    about: text().notNull(),
    kind: varchar({ length: 16 }).notNull(),
    // The true place: only for the two parties of an order, from `scheduled` on.
    street: varchar({ length: 120 }).notNull(),
    city: varchar({ length: 64 }).notNull(),
    state: varchar({ length: 2 }).notNull(),
    zip: varchar({ length: 5 }).notNull(),
    phone: varchar({ length: 24 }).notNull(),
    trueLat: double().notNull(),
    trueLng: double().notNull(),
    // What the public computes with: the centre of the seller's location cell, and nothing finer.
    cellId: varchar({ length: 24 }).notNull(),
    cellLat: double().notNull(),
    cellLng: double().notNull(),
    zone: varchar({ length: 40 }).notNull(),
    licences: jsonOf<LicenceAnswer[]>().notNull(),
    payoutAccountId: varchar({ length: 64 }),
    chargesEnabled: boolean().notNull().default(false),
    payoutsEnabled: boolean().notNull().default(false),
    ratingCount: int({ unsigned: true }).notNull().default(0),
    /** All marks added up, three a rating. */
    ratingSum: int({ unsigned: true }).notNull().default(0),
    fishMarkSum: int({ unsigned: true }).notNull().default(0),
    countMarkSum: int({ unsigned: true }).notNull().default(0),
    contactMarkSum: int({ unsigned: true }).notNull().default(0),
    // Day 7: orders asked and answered; animals handed over and alive in the answered ones.
    survivalAsked: int({ unsigned: true }).notNull().default(0),
    survivalAnswered: int({ unsigned: true }).notNull().default(0),
    survivalHandedOver: int({ unsigned: true }).notNull().default(0),
    survivalAlive: int({ unsigned: true }).notNull().default(0),
    answeredInTime: int({ unsigned: true }).notNull().default(0),
    answersMissed: int({ unsigned: true }).notNull().default(0),
    /** Days promised and missed without a die-off to show for it. */
    daysMissed: int({ unsigned: true }).notNull().default(0),
    createdAt: instant().notNull(),
    updatedAt: instant().notNull(),
  },
  (t) => [index('k_seller_payout').on(t.payoutAccountId), index('k_seller_cell').on(t.cellId)],
)
