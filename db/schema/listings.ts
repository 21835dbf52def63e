import { sql } from 'drizzle-orm'
import {
  check,
  date,
  index,
  int,
  mysqlTable,
  smallint,
  text,
  tinyint,
  uniqueIndex,
  varchar,
} from 'drizzle-orm/mysql-core'

import { instant, jsonOf, memberRef, publicId } from '@/db/schema/columns'
import { seller } from '@/db/schema/sellers'
import type { ListingDraft } from '@/shared/contracts/listings'

/** One listing and the stock it sells from. Its words and terms stand in its versions. */
export const listing = mysqlTable(
  'listing',
  {
    id: int({ unsigned: true }).autoincrement().primaryKey(),
    publicId: publicId(),
    sellerId: int({ unsigned: true })
      .notNull()
      .references(() => seller.id),
    category: varchar({ length: 12 }).notNull(),
    /** draft | pending_review | live | paused | sold_out | expired | taken_down */
    state: varchar({ length: 16 }).notNull(),
    /** The version the public sees and buyers order from. */
    liveVersion: int({ unsigned: true }),
    /** What the seller is typing: saved by itself, perhaps not valid yet. */
    draft: jsonOf<ListingDraft>().notNull(),
    draftRevision: int({ unsigned: true }).notNull().default(0),
    expiresOn: date({ mode: 'string' }),
    // The batch: every animal is in exactly one of these columns, or has left through a stock movement.
    free: int().notNull().default(0),
    held: int().notNull().default(0),
    pledged: int().notNull().default(0),
    sold: int().notNull().default(0),
    shipped: int().notNull().default(0),
    delivered: int().notNull().default(0),
    createdAt: instant().notNull(),
    updatedAt: instant().notNull(),
  },
  (t) => [
    index('k_listing_seller').on(t.sellerId, t.state),
    index('k_listing_state').on(t.state, t.id),
    check(
      'stock_not_negative',
      sql`${t.free} >= 0 and ${t.held} >= 0 and ${t.pledged} >= 0 and ${t.sold} >= 0 and ${t.shipped} >= 0 and ${t.delivered} >= 0`,
    ),
  ],
)

/** Every version ever submitted is kept; orders name the one they were made from. */
export const listingVersion = mysqlTable(
  'listing_version',
  {
    id: int({ unsigned: true }).autoincrement().primaryKey(),
    listingId: int({ unsigned: true })
      .notNull()
      .references(() => listing.id),
    number: int({ unsigned: true }).notNull(),
    body: jsonOf<ListingDraft>().notNull(),
    /** waiting | approved | asked | rejected | superseded */
    review: varchar({ length: 12 }).notNull(),
    /** Why it waits: `new`, `material-edit`, `first-listing` …, shown to the moderator. */
    flags: jsonOf<string[]>().notNull(),
    submittedAt: instant().notNull(),
    decidedAt: instant(),
    decidedBy: memberRef(),
    reasonCode: varchar({ length: 32 }),
    reasonText: text(),
    /** Weight of the flags: the queue shows the riskiest first. */
    risk: smallint({ unsigned: true }).notNull().default(0),
  },
  (t) => [
    uniqueIndex('u_listing_version').on(t.listingId, t.number),
    index('k_version_review').on(t.review, t.risk, t.submittedAt),
  ],
)

/** Stock never moves without a row here. Deltas by place; the reason is the edge or the seller's word. */
export const stockMovement = mysqlTable(
  'stock_movement',
  {
    id: int({ unsigned: true }).autoincrement().primaryKey(),
    listingId: int({ unsigned: true })
      .notNull()
      .references(() => listing.id),
    orderId: int({ unsigned: true }),
    reason: varchar({ length: 40 }).notNull(),
    free: int().notNull().default(0),
    held: int().notNull().default(0),
    pledged: int().notNull().default(0),
    sold: int().notNull().default(0),
    shipped: int().notNull().default(0),
    delivered: int().notNull().default(0),
    by: memberRef(),
    note: varchar({ length: 200 }),
    /** Set where a seller's own command moves stock: the same command never moves it twice. */
    commandId: varchar({ length: 80 }),
    at: instant().notNull(),
  },
  (t) => [
    index('k_stock_listing').on(t.listingId, t.id),
    index('k_stock_order').on(t.orderId),
    uniqueIndex('u_stock_command').on(t.listingId, t.commandId),
  ],
)

/** A published place and time to collect. Buyers hold one place in it. */
export const pickupWindow = mysqlTable(
  'pickup_window',
  {
    id: int({ unsigned: true }).autoincrement().primaryKey(),
    publicId: publicId(),
    listingId: int({ unsigned: true })
      .notNull()
      .references(() => listing.id),
    startsAt: instant().notNull(),
    endsAt: instant().notNull(),
    zone: varchar({ length: 40 }).notNull(),
    capacity: smallint({ unsigned: true }).notNull(),
    taken: smallint({ unsigned: true }).notNull().default(0),
    placeKind: varchar({ length: 12 }).notNull(),
    closed: tinyint().notNull().default(0),
  },
  (t) => [
    index('k_window_listing').on(t.listingId, t.startsAt),
    check('window_not_overbooked', sql`${t.taken} <= ${t.capacity}`),
    check('window_forwards', sql`${t.endsAt} > ${t.startsAt}`),
  ],
)
