import { sql } from 'drizzle-orm'
import {
  boolean,
  check,
  index,
  int,
  mysqlTable,
  smallint,
  text,
  uniqueIndex,
  varchar,
} from 'drizzle-orm/mysql-core'

import { instant, jsonOf, memberRef, publicId } from '@/db/schema/columns'
import { listing, pickupWindow } from '@/db/schema/listings'
import { seller } from '@/db/schema/sellers'

export const order = mysqlTable(
  'orders',
  {
    id: int({ unsigned: true }).autoincrement().primaryKey(),
    publicId: publicId(),
    buyerId: memberRef().notNull(),
    sellerId: int({ unsigned: true })
      .notNull()
      .references(() => seller.id),
    listingId: int({ unsigned: true })
      .notNull()
      .references(() => listing.id),
    /** The snapshot: terms, price and words as they stood. */
    listingVersionId: int({ unsigned: true }).notNull(),
    /** Of the listing: produce has clocks of its own. */
    category: varchar({ length: 12 }).notNull().default('fish'),
    state: varchar({ length: 16 }).notNull(),
    reason: varchar({ length: 32 }),
    /** Rises with every change; each change names the version it saw. */
    version: int({ unsigned: true }).notNull().default(1),
    quantity: int({ unsigned: true }).notNull(),
    /** Units the seller has cut since, because fewer were there; `quantity` is what is left. */
    quantityCut: int({ unsigned: true }).notNull().default(0),
    quantityCutAt: instant(),
    /** Part of their price that was never charged: taken off the balance, and off goods and total with it. */
    cutFromBalanceCents: int({ unsigned: true }).notNull().default(0),
    handOver: varchar({ length: 8 }).notNull(),
    payMode: varchar({ length: 8 }).notNull(),
    balanceDue: varchar({ length: 12 }).notNull(),
    needsAcceptance: boolean().notNull(),
    goodsCents: int({ unsigned: true }).notNull(),
    boxCents: int({ unsigned: true }).notNull().default(0),
    freightCents: int({ unsigned: true }).notNull().default(0),
    taxCents: int({ unsigned: true }).notNull().default(0),
    totalCents: int({ unsigned: true }).notNull(),
    /** What the listing's percentage gives: the cap of everything that may ever be kept. */
    depositCents: int({ unsigned: true }).notNull(),
    /** What the first charge takes: the deposit, or everything when paid in full. */
    firstChargeCents: int({ unsigned: true }).notNull(),
    balanceCents: int({ unsigned: true }).notNull(),
    feeBp: smallint({ unsigned: true }).notNull(),
    feeCents: int({ unsigned: true }).notNull(),
    refundedCents: int({ unsigned: true }).notNull().default(0),
    windowId: int({ unsigned: true }).references(() => pickupWindow.id),
    slotStartsAt: instant(),
    slotEndsAt: instant(),
    zone: varchar({ length: 40 }).notNull(),
    buyerState: varchar({ length: 2 }).notNull(),
    buyerCell: varchar({ length: 24 }).notNull(),
    /** Six digits the buyer gives last, at the hand-over. */
    handOverCode: varchar({ length: 6 }).notNull(),
    codeTries: smallint({ unsigned: true }).notNull().default(0),
    countHandedOver: int({ unsigned: true }),
    acceptedAt: instant(),
    balancePaidAt: instant(),
    handedOverAt: instant(),
    settledAt: instant(),
    /** A party says the other did not come: until the contest clock ends, the other may object. */
    noShowBy: varchar({ length: 6 }),
    noShowAt: instant(),
    buyerMoves: smallint({ unsigned: true }).notNull().default(0),
    sellerMoves: smallint({ unsigned: true }).notNull().default(0),
    claimType: varchar({ length: 20 }),
    /** The day now agreed came by the buyer's silence: it binds nobody to its free time. */
    isDayBySilence: boolean().notNull().default(false),
    /** The next timer: when it rings and which edge it tries. Null only in a final state. */
    clockAt: instant(),
    clockEdge: varchar({ length: 4 }),
    freeze: varchar({ length: 8 }).notNull().default('none'),
    paymentDispute: varchar({ length: 6 }).notNull().default('none'),
    recall: varchar({ length: 8 }).notNull().default('none'),
    createdAt: instant().notNull(),
    updatedAt: instant().notNull(),
  },
  (t) => [
    index('k_order_buyer').on(t.buyerId, t.id),
    index('k_order_seller').on(t.sellerId, t.state, t.slotStartsAt),
    index('k_order_listing').on(t.listingId, t.state),
    index('k_order_clock').on(t.clockAt),
    // Who is to be reminded: pickups of the next hours.
    index('k_order_slot').on(t.state, t.slotStartsAt),
    check(
      'order_adds_up',
      sql`${t.totalCents} = ${t.goodsCents} + ${t.boxCents} + ${t.freightCents} + ${t.taxCents}`,
    ),
    check('charges_add_up', sql`${t.totalCents} = ${t.firstChargeCents} + ${t.balanceCents}`),
  ],
)

export const orderEvent = mysqlTable(
  'order_event',
  {
    id: int({ unsigned: true }).autoincrement().primaryKey(),
    orderId: int({ unsigned: true })
      .notNull()
      .references(() => order.id),
    /** Repeating a command id changes nothing. */
    commandId: varchar({ length: 80 }).notNull(),
    edge: varchar({ length: 4 }).notNull(),
    fromState: varchar({ length: 16 }),
    toState: varchar({ length: 16 }).notNull(),
    actor: varchar({ length: 10 }).notNull(),
    actorId: memberRef(),
    note: text(),
    facts: jsonOf<Record<string, string | number | boolean>>().notNull(),
    at: instant().notNull(),
  },
  (t) => [
    uniqueIndex('u_order_command').on(t.orderId, t.commandId),
    index('k_event_order').on(t.orderId, t.id),
  ],
)
