import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { dayOf } from '@/server/listings/day-of'
import { describeListing } from '@/server/listings/describe-listing'
import { findSellerOf } from '@/server/orders/party-store'
import { monthAfter, monthBegins } from '@/server/statements/make-statement'
import { listReleased, type ReleasedRow } from '@/server/statements/statement-store'
import { Problem } from '@/shared/api/problem'
import type { SellerRecord } from '@/shared/contracts/statements'
import { dateAfter } from '@/shared/domain/calendar/day-number'
import { INFORM_DAYS, informCount, informLine } from '@/shared/domain/selling/inform-count'
import { findTaxon } from '@/shared/domain/species/find-taxon'

const MONTHS_SHOWN = 12
const MONTHS_COUNTED = 24

function monthsBefore(month: string, count: number): string {
  const [year = NaN, number = NaN] = month.split('-').map(Number)
  const gone = year * 12 + (number - 1) - count
  return `${Math.floor(gone / 12)}-${String((gone % 12) + 1).padStart(2, '0')}`
}

/** What a buyer would call it: the species, or the listing's title for what has none. */
const kindOf = ({ body }: ReleasedRow) =>
  ('taxonId' in body ? findTaxon(body.taxonId)?.commonName : undefined) ?? describeListing(body).title

function kindsOf(rows: readonly ReleasedRow[]): SellerRecord['months'][number]['kinds'] {
  const kinds = new Map<string, { name: string; quantity: number; goodsCents: number }>()
  for (const row of rows) {
    const name = kindOf(row)
    const before = kinds.get(name) ?? { name, quantity: 0, goodsCents: 0 }
    kinds.set(name, {
      name,
      quantity: before.quantity + row.quantity,
      goodsCents: before.goodsCents + row.goodsCents,
    })
  }
  return [...kinds.values()].sort((a, b) => b.goodsCents - a.goodsCents || a.name.localeCompare(b.name))
}

/** A seller's sales month by month, and the count that the INFORM Consumers Act asks a platform to keep. */
export async function readRecord(caller: Caller): Promise<SellerRecord> {
  const seller = await findSellerOf(caller.memberId)
  if (!seller) throw new Problem('not-found')
  const { zone } = seller
  const today = dayOf(now(), zone)
  const month = today.slice(0, 7)
  const span = {
    from: monthBegins(monthsBefore(month, MONTHS_COUNTED), zone),
    until: monthBegins(monthAfter(month), zone),
  }
  const sold = (await listReleased(seller.id, span)).filter((row) => row.state === 'settled')
  const dated = sold.map((row) => ({ row, day: dayOf(row.at, zone) }))
  const count = informCount(
    dated.map(({ row, day }) => ({ day, grossCents: row.goodsCents })),
    today,
  )
  return {
    months: Array.from({ length: MONTHS_SHOWN }, (_, at) => {
      const shown = monthsBefore(month, MONTHS_SHOWN - 1 - at)
      return {
        month: shown,
        kinds: kindsOf(dated.filter(({ day }) => day.startsWith(shown)).map(({ row }) => row)),
      }
    }),
    inform: {
      sales: count.sales,
      grossCents: count.grossCents,
      isOver: count.sales >= informLine.sales && count.grossCents >= informLine.grossCents,
      ...(count.reachedOn ? { dueOn: dateAfter(count.reachedOn, INFORM_DAYS) } : {}),
    },
  }
}
