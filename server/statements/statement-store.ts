import { and, asc, eq, gte, inArray, lt, sql } from 'drizzle-orm'

import { db } from '@/db/client'
import { listingVersion } from '@/db/schema/listings'
import { order } from '@/db/schema/orders'
import { ledgerEntry, ledgerGroup } from '@/db/schema/payments'
import type { ListingBody } from '@/shared/contracts/listings'

export interface ReleasedRow {
  orderId: number
  publicId: string
  at: Date
  state: string
  quantity: number
  goodsCents: number
  body: ListingBody
  yoursCents: number
  feeCents: number
  taxCents: number
}

/** Orders of a seller whose money was released between two moments, as the ledger booked it, soonest first. */
export async function listReleased(
  sellerId: number,
  span: { from: Date; until: Date },
): Promise<ReleasedRow[]> {
  const of = (account: string) =>
    sql<number>`coalesce(sum(case when ${ledgerEntry.account} = ${account} then ${ledgerEntry.amountCents} end), 0)`
  const rows = await db()
    .select({
      orderId: order.id,
      publicId: order.publicId,
      at: ledgerGroup.at,
      state: order.state,
      quantity: order.quantity,
      goodsCents: order.goodsCents,
      versionId: order.listingVersionId,
      yoursCents: of('seller_payable'),
      feeCents: of('platform_fee'),
      taxCents: of('tax_payable'),
    })
    .from(order)
    .innerJoin(ledgerGroup, and(eq(ledgerGroup.orderId, order.id), eq(ledgerGroup.kind, 'settlement')))
    .innerJoin(ledgerEntry, eq(ledgerEntry.groupId, ledgerGroup.id))
    .where(and(eq(order.sellerId, sellerId), gte(ledgerGroup.at, span.from), lt(ledgerGroup.at, span.until)))
    .groupBy(ledgerGroup.id)
    .orderBy(asc(ledgerGroup.at), asc(ledgerGroup.id))
  const bodies = await bodiesOf([...new Set(rows.map((row) => row.versionId))])
  return rows.flatMap(({ versionId, yoursCents, feeCents, taxCents, ...row }) => {
    const body = bodies.get(versionId)
    const sums = { yoursCents: Number(yoursCents), feeCents: Number(feeCents), taxCents: Number(taxCents) }
    return body ? [{ ...row, body, ...sums }] : []
  })
}

async function bodiesOf(versionIds: number[]): Promise<Map<number, ListingBody>> {
  if (versionIds.length === 0) return new Map()
  const rows = await db()
    .select({ id: listingVersion.id, body: listingVersion.body })
    .from(listingVersion)
    .where(inArray(listingVersion.id, versionIds))
  return new Map(rows.map((row) => [row.id, row.body as ListingBody]))
}

/** What the buyers of these orders paid and what went back to them, as the ledger booked it. */
export async function sumPaid(
  orderIds: number[],
): Promise<Map<number, { paidCents: number; refundedCents: number }>> {
  if (orderIds.length === 0) return new Map()
  const of = (kind: string, sign: 1 | -1) =>
    sql<number>`coalesce(sum(case when ${ledgerGroup.kind} = ${kind} then ${ledgerEntry.amountCents} * ${sign} end), 0)`
  const rows = await db()
    .select({ orderId: ledgerEntry.orderId, paid: of('capture', -1), back: of('refund', 1) })
    .from(ledgerEntry)
    .innerJoin(ledgerGroup, eq(ledgerGroup.id, ledgerEntry.groupId))
    .where(and(inArray(ledgerEntry.orderId, orderIds), eq(ledgerEntry.account, 'buyer_card')))
    .groupBy(ledgerEntry.orderId)
  return new Map(
    rows.map((row) => [row.orderId, { paidCents: Number(row.paid), refundedCents: Number(row.back) }]),
  )
}
