import { asc, gte } from 'drizzle-orm'

import { db, type Tx } from '@/db/client'
import { noShipDay } from '@/db/schema/shipments'

export type NoShipDayRow = typeof noShipDay.$inferSelect

/** Rows from a day on, those taken off included, soonest first. */
export async function listNoShipRows(fromDay: string, tx: Tx = db()): Promise<NoShipDayRow[]> {
  return tx.select().from(noShipDay).where(gte(noShipDay.day, fromDay)).orderBy(asc(noShipDay.day))
}

/** Puts days in that do not stand there yet; a row that stands, taken off or not, stays as it is. */
export async function addNoShipDays(rows: (typeof noShipDay.$inferInsert)[], tx: Tx = db()): Promise<void> {
  if (rows.length > 0) await tx.insert(noShipDay).ignore().values(rows)
}

/** What a moderator says of a day; where the day comes from stays as it is. */
export async function putNoShipDay(tx: Tx, row: typeof noShipDay.$inferInsert): Promise<void> {
  const { why, isOff, changedBy, changedAt } = row
  await tx.insert(noShipDay).values(row).onDuplicateKeyUpdate({ set: { why, isOff, changedBy, changedAt } })
}
