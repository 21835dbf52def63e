import { and, eq, inArray, sql } from 'drizzle-orm'

import { db, type Tx } from '@/db/client'
import { ledgerEntry, ledgerGroup } from '@/db/schema/payments'
import { errnoOf } from '@/db/transaction'

/** The accounts of orders-and-money's double entry: a positive amount is what the account gains. */
export const ledgerAccounts = [
  'buyer_card',
  'held',
  'seller_payable',
  'seller_connected',
  'platform_fee',
  'processor_cost',
  'tax_payable',
  'seller_debt',
  'platform_loss',
  'dispute_reserve',
] as const
export type LedgerAccount = (typeof ledgerAccounts)[number]

export interface Booking {
  orderId: number
  sellerId: number
  kind: 'capture' | 'processor-cost' | 'refund' | 'settlement' | 'transfer'
  /** What is booked, once: a second booking of the same cause is a no-op. */
  cause: string
  processorId: string | null
  rows: [account: LedgerAccount, amountCents: number][]
  at: Date
}

const DUPLICATE = 1062

/** Writes one group whose rows sum to zero; false when its cause is booked already. Throws on a sum that is not zero. */
export async function book(tx: Tx, booking: Booking): Promise<boolean> {
  const sum = booking.rows.reduce((total, [, cents]) => total + cents, 0)
  if (sum !== 0 || booking.rows.length < 2)
    throw new Error(`the rows of ${booking.cause} sum to ${sum}, not 0`)
  const { orderId, sellerId, kind, cause, processorId, at } = booking
  let groupId: number
  try {
    const [group] = await tx
      .insert(ledgerGroup)
      .values({ orderId, kind, cause, processorId, at })
      .$returningId()
    if (!group) throw new Error('the ledger group has no number')
    groupId = group.id
  } catch (error) {
    if (errnoOf(error) === DUPLICATE) return false
    throw error
  }
  await tx
    .insert(ledgerEntry)
    .values(
      booking.rows
        .filter(([, amountCents]) => amountCents !== 0)
        .map(([account, amountCents]) => ({ groupId, account, amountCents, orderId, sellerId })),
    )
  return true
}

/** Balance of each account for each order: what the money strip shows. */
export async function balancesOf(
  orderIds: number[],
): Promise<Map<number, Partial<Record<LedgerAccount, number>>>> {
  const found = new Map<number, Partial<Record<LedgerAccount, number>>>()
  if (orderIds.length === 0) return found
  const rows = await db()
    .select({
      orderId: ledgerEntry.orderId,
      account: ledgerEntry.account,
      cents: sql<string>`sum(${ledgerEntry.amountCents})`,
    })
    .from(ledgerEntry)
    .where(inArray(ledgerEntry.orderId, orderIds))
    .groupBy(ledgerEntry.orderId, ledgerEntry.account)
  for (const row of rows) {
    const balances = found.get(row.orderId) ?? {}
    balances[row.account as LedgerAccount] = Number(row.cents)
    found.set(row.orderId, balances)
  }
  return found
}

export async function balanceOf(tx: Tx, orderId: number, account: LedgerAccount): Promise<number> {
  const [row] = await tx
    .select({ cents: sql<string>`coalesce(sum(${ledgerEntry.amountCents}), 0)` })
    .from(ledgerEntry)
    .where(and(eq(ledgerEntry.orderId, orderId), eq(ledgerEntry.account, account)))
  return Number(row?.cents ?? 0)
}
