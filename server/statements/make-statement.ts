import { instantOf } from '@/server/listings/instant-of'
import { dayOf } from '@/server/listings/day-of'
import { describeListing } from '@/server/listings/describe-listing'
import type { Caller } from '@/server/http/caller'
import { findSellerOf } from '@/server/orders/party-store'
import { listReleased, sumPaid, type ReleasedRow } from '@/server/statements/statement-store'
import { Problem } from '@/shared/api/problem'
import type { Statement, StatementRow } from '@/shared/contracts/statements'

/** The first moment of a month by the calendar of a place. Where clocks change at midnight, the next quarter of an hour. */
export function monthBegins(month: string, zone: string): Date {
  for (const time of ['00:00', '00:15', '00:30', '00:45', '01:00']) {
    const found = instantOf(`${month}-01`, time, zone)
    if (found.kind === 'once') return found.at
  }
  throw new RangeError(`no beginning of ${month} in ${zone}`)
}

export function monthAfter(month: string): string {
  const [year = NaN, number = NaN] = month.split('-').map(Number)
  return number === 12 ? `${year + 1}-01` : `${year}-${String(number + 1).padStart(2, '0')}`
}

type Paid = { paidCents: number; refundedCents: number } | undefined

function rowOf(released: ReleasedRow, paid: Paid, zone: string): StatementRow {
  const { publicId, at, state, quantity, body, yoursCents, feeCents, taxCents } = released
  return {
    orderId: publicId,
    day: dayOf(at, zone),
    title: describeListing(body).title,
    kind: state === 'cancelled' ? 'kept' : 'complete',
    ...{ quantity, yoursCents, feeCents, taxCents },
    paidCents: paid?.paidCents ?? 0,
    refundedCents: paid?.refundedCents ?? 0,
  }
}

const parts = ['paidCents', 'refundedCents', 'taxCents', 'feeCents', 'yoursCents'] as const

/** A month of a seller: what was released, order by order, and its sums; every figure from the ledger. */
export async function makeStatement(caller: Caller, month: string): Promise<Statement> {
  const seller = await findSellerOf(caller.memberId)
  if (!seller) throw new Problem('not-found')
  const { zone } = seller
  const span = { from: monthBegins(month, zone), until: monthBegins(monthAfter(month), zone) }
  const released = await listReleased(seller.id, span)
  const paid = await sumPaid(released.map((one) => one.orderId))
  const rows = released.map((one) => rowOf(one, paid.get(one.orderId), zone))
  const sum = (part: (typeof parts)[number]) => rows.reduce((total, row) => total + row[part], 0)
  const [paidCents, refundedCents, taxCents, feeCents, yoursCents] = parts.map(sum)
  return {
    ...{ month, zone, rows },
    total: {
      paidCents: paidCents ?? 0,
      refundedCents: refundedCents ?? 0,
      taxCents: taxCents ?? 0,
      feeCents: feeCents ?? 0,
      yoursCents: yoursCents ?? 0,
    },
  }
}
