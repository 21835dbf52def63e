import {
  boolean,
  date,
  double,
  index,
  int,
  mysqlTable,
  smallint,
  uniqueIndex,
  varchar,
} from 'drizzle-orm/mysql-core'

import { instant, jsonOf, memberRef } from '@/db/schema/columns'
import { pickupWindow } from '@/db/schema/listings'
import { order } from '@/db/schema/orders'
import type { MovementFacts, RouteCheckFacts, RoutePaper, ShipAddress } from '@/shared/contracts/shipments'

const dayOnly = () => date({ mode: 'string' })

/** What an order that is shipped has beside the order itself; one row from the hold on. */
export const shipment = mysqlTable('shipment', {
  orderId: int({ unsigned: true })
    .primaryKey()
    .references(() => order.id),
  /** The day agreed, in the seller's zone; the order's slot is that day's working hours. */
  shipDay: dayOnly().notNull(),
  arriveDay: dayOnly().notNull(),
  /** End of the promised day where it arrives: the late clock counts from here. */
  promisedAt: instant().notNull(),
  packing: varchar({ length: 24 }).notNull(),
  boxes: smallint({ unsigned: true }).notNull(),
  /** door | counter */
  deliverTo: varchar({ length: 8 }).notNull(),
  carrier: varchar({ length: 60 }).notNull(),
  address: jsonOf<ShipAddress>().notNull(),
  // The middle of the buyer's area: what forecasts are asked for, nothing finer.
  toLat: double().notNull(),
  toLng: double().notNull(),
  toZone: varchar({ length: 40 }).notNull(),
  papers: jsonOf<RoutePaper[]>().notNull(),
  tracking: varchar({ length: 60 }),
  dispatchedAt: instant(),
  arrivedAt: instant(),
  /** Of a late box: how many the buyer found alive, while a moderator has not decided. */
  aliveCount: int({ unsigned: true }),
  /** What travelled, as it stood at dispatch; null before. */
  movement: jsonOf<MovementFacts>(),
})

/** Every check of a route, kept for ever: what was known when, and what was decided by it. */
export const routeCheck = mysqlTable(
  'route_check',
  {
    id: int({ unsigned: true }).autoincrement().primaryKey(),
    orderId: int({ unsigned: true })
      .notNull()
      .references(() => order.id),
    /** reservation | evening | morning | seller */
    kind: varchar({ length: 12 }).notNull(),
    /** The ship day it was made for: a check of another day says nothing. */
    shipDay: dayOnly().notNull(),
    at: instant().notNull(),
    /** safe | unsafe | unknown */
    verdict: varchar({ length: 8 }).notNull(),
    facts: jsonOf<RouteCheckFacts>().notNull(),
  },
  (t) => [index('k_route_check_order').on(t.orderId, t.id)],
)

/** Each time weather stopped a day: what was proposed instead and what the buyer said. */
export const weatherHold = mysqlTable(
  'weather_hold',
  {
    id: int({ unsigned: true }).autoincrement().primaryKey(),
    orderId: int({ unsigned: true })
      .notNull()
      .references(() => order.id),
    /** 1 for the first of an order. */
    number: smallint({ unsigned: true }).notNull(),
    /** system | seller */
    startedBy: varchar({ length: 8 }).notNull(),
    startedAt: instant().notNull(),
    /** Why, as both parties read it. */
    why: varchar({ length: 300 }).notNull(),
    fromStartsAt: instant().notNull(),
    // The day or window proposed; all null: open-ended.
    proposedStartsAt: instant(),
    proposedEndsAt: instant(),
    proposedShipDay: dayOnly(),
    /** A pickup: its place in the window is held meanwhile. */
    proposedWindowId: int({ unsigned: true }).references(() => pickupWindow.id),
    /** Whether silence moves the day, fixed when the hold begins. */
    silenceMoves: boolean().notNull(),
    /** agreed | silence | declined | no-consent | cancelled; null while open */
    answer: varchar({ length: 12 }),
    answeredAt: instant(),
  },
  (t) => [uniqueIndex('u_hold_number').on(t.orderId, t.number)],
)

/** Days without carriers: federal holidays by themselves, and whatever a moderator adds or takes off. */
export const noShipDay = mysqlTable('no_ship_day', {
  day: dayOnly().primaryKey(),
  why: varchar({ length: 80 }).notNull(),
  /** federal | own */
  source: varchar({ length: 8 }).notNull(),
  /** Taken off by a moderator; kept so that a federal day does not come back by itself. */
  isOff: boolean().notNull().default(false),
  changedBy: memberRef(),
  changedAt: instant().notNull(),
})
