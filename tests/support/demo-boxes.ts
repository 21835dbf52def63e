import { sql } from 'drizzle-orm'

import { db } from '@/db/client'
import { dayOf } from '@/server/listings/day-of'

/** An order of the demo that goes by box. */
export interface DemoBox {
  orderId: string
  state: string
  buyerEmail: string
  buyerName: string
  sellerEmail: string
  farmName: string
  quantity: number
  totalCents: number
  shipDay: string
  arriveDay: string
  street: string
  zone: string
  /** The middle of the seller's area: what the weather of the way is asked for. */
  fromLat: number
  fromLng: number
}

/** Paid boxes between neighbours (none of the people that `npm start` prints) that have not left. */
async function paidBoxes(): Promise<DemoBox[]> {
  const [rows] = (await db().execute(sql`
    SELECT o.public_id AS orderId, o.state, b.email AS buyerEmail, b.name AS buyerName, f.email AS sellerEmail,
           s.farm_name AS farmName, o.quantity, o.total_cents AS totalCents, x.ship_day AS shipDay,
           x.arrive_day AS arriveDay, JSON_VALUE(x.address, '$.street') AS street, o.zone,
           s.cell_lat AS fromLat, s.cell_lng AS fromLng
    FROM orders o JOIN shipment x ON x.order_id = o.id JOIN user b ON b.id = o.buyer_id
      JOIN seller s ON s.id = o.seller_id JOIN user f ON f.id = s.member_id
    WHERE o.state IN ('scheduled', 'ready') AND o.balance_paid_at IS NOT NULL
      AND b.email LIKE '%@growers.example' AND f.email LIKE '%@farms.example'
    ORDER BY o.id`)) as unknown as [DemoBox[]]
  return rows
}

const todayOf = ({ zone }: DemoBox, clockOffsetMs: number) =>
  dayOf(new Date(Date.now() + clockOffsetMs), zone)

/** One that is ready and leaves today, the first such one. */
export async function boxOfToday(clockOffsetMs: number): Promise<DemoBox> {
  const found = (await paidBoxes()).find(
    (box) => box.state === 'ready' && box.shipDay === todayOf(box, clockOffsetMs),
  )
  if (!found) throw new Error('no box of the demo leaves today')
  return found
}

/** Two of one farm that leave on the same later day, to two people. */
export async function twoBoxesToCome(clockOffsetMs: number): Promise<[DemoBox, DemoBox]> {
  const boxes = (await paidBoxes()).filter((box) => box.shipDay > todayOf(box, clockOffsetMs))
  for (const one of boxes) {
    const other = boxes.find(
      (box) =>
        box.sellerEmail === one.sellerEmail &&
        box.shipDay === one.shipDay &&
        box.buyerEmail !== one.buyerEmail,
    )
    if (other) return [one, other]
  }
  throw new Error('no farm of the demo has two boxes leave on one day to come')
}

/** Lets so many hours pass since the way of one order was last looked at. */
export async function ageLooks(orderId: string, hours: number): Promise<void> {
  await db().execute(sql`
    UPDATE route_check c JOIN orders o ON o.id = c.order_id
    SET c.at = DATE_SUB(c.at, INTERVAL ${hours} HOUR) WHERE o.public_id = ${orderId}`)
}
