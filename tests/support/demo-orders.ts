import { sql } from 'drizzle-orm'

import { db } from '@/db/client'

export interface DemoOrder {
  orderId: string
  buyerEmail: string
  sellerEmail: string
  paidCents: number
  depositCents: number
  totalCents: number
}

/** An order of the demo between two neighbours (none of the people that `npm start` prints), the first such one. */
export async function demoOrder(wish: {
  state: 'scheduled' | 'ready'
  isBalancePaid: boolean
}): Promise<DemoOrder> {
  const paid = wish.isBalancePaid ? sql`IS NOT NULL` : sql`IS NULL`
  const [rows] = (await db().execute(sql`
    SELECT o.public_id AS orderId, b.email AS buyerEmail, f.email AS sellerEmail, o.deposit_cents AS depositCents,
           o.total_cents AS totalCents,
           o.first_charge_cents + IF(o.balance_paid_at IS NULL OR o.pay_mode = 'full', 0, o.balance_cents) AS paidCents
    FROM orders o JOIN user b ON b.id = o.buyer_id JOIN seller s ON s.id = o.seller_id JOIN user f ON f.id = s.member_id
    WHERE o.state = ${wish.state} AND o.balance_paid_at ${paid} AND o.no_show_by IS NULL
      AND b.email LIKE '%@growers.example' AND f.email LIKE '%@farms.example'
    ORDER BY o.id LIMIT 1`)) as unknown as [DemoOrder[]]
  const [found] = rows
  if (!found) throw new Error(`no order of the demo is ${wish.state}, ${JSON.stringify(wish)}`)
  return found
}

/** Lets time pass for one order alone: its window now begins so many hours from now, and lasts one. */
export async function moveSlot(orderId: string, startsInHours: number, clockOffsetMs: number): Promise<void> {
  const startsAt = new Date(Date.now() + clockOffsetMs + startsInHours * 3_600_000)
  const endsAt = new Date(startsAt.getTime() + 3_600_000)
  await db().execute(
    sql`UPDATE orders SET slot_starts_at = ${startsAt}, slot_ends_at = ${endsAt} WHERE public_id = ${orderId}`,
  )
}
