import { now } from '@/server/clock'
import { federalDays } from '@/server/shipping/federal-days'
import { addNoShipDays, listNoShipRows, type NoShipDayRow } from '@/server/shipping/no-ship-days-store'
import type { NoShipDays } from '@/shared/domain/shipping/ship-days'

const YEARS_AHEAD = 2

/** The federal holidays of this year and the next two stand in the table; one taken off by a moderator stays off. */
export async function keepFederalDays(): Promise<void> {
  const at = now()
  const year = at.getUTCFullYear()
  const days = federalDays(year, year + YEARS_AHEAD)
  await addNoShipDays(days.map((one) => ({ ...one, source: 'federal', changedAt: at })))
}

/** Rows from a day on. A database that has not met its daily job yet gets the federal days first. */
export async function noShipRowsFrom(day: string): Promise<NoShipDayRow[]> {
  const rows = await listNoShipRows(day)
  const last = String(now().getUTCFullYear() + YEARS_AHEAD)
  if (rows.some((row) => row.source === 'federal' && row.day.startsWith(last))) return rows
  await keepFederalDays()
  return listNoShipRows(day)
}

/** Days without carriers from a day on, as the rule of ship days reads them. */
export async function noShipDaysFrom(day: string): Promise<NoShipDays> {
  const rows = await noShipRowsFrom(day)
  return new Map(rows.filter(({ isOff }) => !isOff).map((row) => [row.day, row.why]))
}
