import { bigint, index, int, mysqlTable, smallint, uniqueIndex, varchar } from 'drizzle-orm/mysql-core'

import { instant, jsonOf } from '@/db/schema/columns'
import { order } from '@/db/schema/orders'

/** One charge of an order: the deposit (or everything), or the balance. */
export const payment = mysqlTable(
  'payment',
  {
    id: int({ unsigned: true }).autoincrement().primaryKey(),
    orderId: int({ unsigned: true })
      .notNull()
      .references(() => order.id),
    purpose: varchar({ length: 8 }).notNull(),
    amountCents: int({ unsigned: true }).notNull(),
    /** opening | open | authorised | captured | voided | expired | failed */
    status: varchar({ length: 12 }).notNull(),
    sessionId: varchar({ length: 96 }).unique(),
    payUrl: varchar({ length: 1000 }),
    intentId: varchar({ length: 96 }),
    chargeId: varchar({ length: 96 }),
    processorCostCents: int({ unsigned: true }).notNull().default(0),
    refundedCents: int({ unsigned: true }).notNull().default(0),
    captureBefore: instant(),
    createdAt: instant().notNull(),
    updatedAt: instant().notNull(),
  },
  (t) => [index('k_payment_order').on(t.orderId), index('k_payment_intent').on(t.intentId)],
)

/** Money sent back to a buyer: a state, not a moment. */
export const refund = mysqlTable(
  'refund',
  {
    id: int({ unsigned: true }).autoincrement().primaryKey(),
    orderId: int({ unsigned: true }).notNull(),
    paymentId: int({ unsigned: true }).notNull(),
    amountCents: int({ unsigned: true }).notNull(),
    /** wanted | sent | done | failed */
    status: varchar({ length: 8 }).notNull(),
    processorId: varchar({ length: 96 }),
    why: varchar({ length: 40 }).notNull(),
    createdAt: instant().notNull(),
    updatedAt: instant().notNull(),
  },
  (t) => [index('k_refund_order').on(t.orderId)],
)

/** The one transfer of a settled order to its seller. */
export const transfer = mysqlTable('transfer', {
  orderId: int({ unsigned: true }).primaryKey(),
  amountCents: int({ unsigned: true }).notNull(),
  /** wanted | done */
  status: varchar({ length: 8 }).notNull(),
  processorId: varchar({ length: 96 }),
  /** How often the balance did not bear it. */
  refusals: smallint({ unsigned: true }).notNull().default(0),
  createdAt: instant().notNull(),
  updatedAt: instant().notNull(),
})

/** Verified events of the processor, each applied once. */
export const processorEvent = mysqlTable(
  'processor_event',
  {
    id: varchar({ length: 96 }).primaryKey(),
    type: varchar({ length: 64 }).notNull(),
    facts: jsonOf<Record<string, string | null>>().notNull(),
    receivedAt: instant().notNull(),
    appliedAt: instant(),
  },
  (t) => [index('k_processor_event_waiting').on(t.appliedAt, t.receivedAt)],
)

/** Rows that belong together and sum to zero. */
export const ledgerGroup = mysqlTable(
  'ledger_group',
  {
    id: int({ unsigned: true }).autoincrement().primaryKey(),
    orderId: int({ unsigned: true }).notNull(),
    kind: varchar({ length: 24 }).notNull(),
    /** Says which happening this books, so that it is booked once: `capture:pi_…`, `settle:42`. */
    cause: varchar({ length: 120 }).notNull(),
    /** The processor's object behind it; null for bookings between our own accounts. */
    processorId: varchar({ length: 96 }),
    at: instant().notNull(),
  },
  (t) => [uniqueIndex('u_ledger_cause').on(t.cause), index('k_ledger_group_order').on(t.orderId)],
)

export const ledgerEntry = mysqlTable(
  'ledger_entry',
  {
    id: bigint({ mode: 'number', unsigned: true }).autoincrement().primaryKey(),
    groupId: int({ unsigned: true })
      .notNull()
      .references(() => ledgerGroup.id),
    account: varchar({ length: 20 }).notNull(),
    /** What the account gains; negative is what it gives. */
    amountCents: int().notNull(),
    orderId: int({ unsigned: true }).notNull(),
    sellerId: int({ unsigned: true }),
  },
  (t) => [index('k_ledger_order').on(t.orderId, t.account), index('k_ledger_group').on(t.groupId)],
)
