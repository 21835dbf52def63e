import { sql } from 'drizzle-orm'

import type { Database } from '@/db/client'

/** Each query must find nothing once the outbox has come to rest. */
const invariants: Record<string, string> = {
  'every group sums to zero':
    'select group_id, sum(amount_cents) s from ledger_entry group by group_id having s <> 0',
  'the whole ledger sums to zero': 'select sum(amount_cents) s from ledger_entry having s <> 0',
  'nothing is held below zero':
    "select order_id, sum(amount_cents) s from ledger_entry where account = 'held' group by order_id having s < 0",
  'a finished order holds nothing': `select e.order_id, sum(e.amount_cents) s from ledger_entry e join orders o on o.id = e.order_id
     where e.account = 'held' and o.state in ('settled', 'cancelled') group by e.order_id having s <> 0`,
  'a seller is never owed below zero':
    "select order_id, sum(amount_cents) s from ledger_entry where account = 'seller_payable' group by order_id having s < 0",
  'captured is what payments say': `select p.order_id, sum(p.amount_cents) s,
     (select -coalesce(sum(e.amount_cents), 0) from ledger_entry e join ledger_group g on g.id = e.group_id
       where e.order_id = p.order_id and g.kind = 'capture' and e.account = 'buyer_card') booked
     from payment p where p.status = 'captured' group by p.order_id having s <> booked`,
  'refunds never exceed the charge': 'select id from payment where refunded_cents > amount_cents',
  'every booked charge, refund and transfer names its object':
    "select id from ledger_group where kind <> 'settlement' and processor_id is null",
  'every animal is somewhere': `select l.id from listing l join (select listing_id, sum(free) f, sum(held) h, sum(pledged) p, sum(sold) s,
       sum(shipped) sh, sum(delivered) d from stock_movement group by listing_id) m on m.listing_id = l.id
     where m.f <> l.free or m.h <> l.held or m.p <> l.pledged or m.s <> l.sold or m.sh <> l.shipped or m.d <> l.delivered`,
  'every order that runs has a clock':
    "select id from orders where state not in ('settled', 'cancelled') and clock_at is null",
}

/** Names of the invariants that are broken, with the rows found; an empty list is a clean book. */
export async function brokenInvariants(db: Database): Promise<string[]> {
  const broken: string[] = []
  for (const [name, query] of Object.entries(invariants)) {
    const [rows] = await db.execute(sql.raw(query))
    const found = rows as unknown as unknown[]
    if (found.length > 0) broken.push(`${name}: ${JSON.stringify(found.slice(0, 3))}`)
  }
  return broken
}
