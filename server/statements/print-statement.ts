import type { Caller } from '@/server/http/caller'
import { makeStatement } from '@/server/statements/make-statement'
import { writeCsv } from '@/server/statements/write-csv'

const dollars = (amountCents: number) => amountCents / 100

/** The statement of a month as a table: amounts in dollars, as numbers. */
export async function printStatement(caller: Caller, month: string): Promise<Uint8Array<ArrayBuffer>> {
  const { rows } = await makeStatement(caller, month)
  return writeCsv(
    rows.map((row) => ({
      day: row.day,
      order: row.orderId,
      title: row.title,
      kind: row.kind,
      quantity: row.quantity,
      paid: dollars(row.paidCents),
      refunded: dollars(row.refundedCents),
      tax: dollars(row.taxCents),
      fee: dollars(row.feeCents),
      yours: dollars(row.yoursCents),
    })),
    [
      { key: 'day', header: 'Day' },
      { key: 'order', header: 'Order' },
      { key: 'title', header: 'What' },
      { key: 'kind', header: 'Kind' },
      { key: 'quantity', header: 'Count' },
      { key: 'paid', header: 'Paid by the buyer, $' },
      { key: 'refunded', header: 'Refunded, $' },
      { key: 'tax', header: 'Tax, $' },
      { key: 'fee', header: 'Our fee, $' },
      { key: 'yours', header: 'Yours, $' },
    ],
  )
}
