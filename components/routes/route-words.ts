import { basisWords, verdictLook, type VerdictLook } from '@/components/shipping/ship-day-words'
import type { RouteRow } from '@/shared/contracts/ship-acts'

/** The last verdict of a way; one that nobody has looked at says so. */
export function routeLook({ verdict }: Pick<RouteRow, 'verdict'>): VerdictLook {
  return verdict
    ? verdictLook({ verdict, worst: undefined })
    : { word: 'Not looked at yet', tone: 'info', icon: 'eye' }
}

/** What it rests on, and the worst of the way or how to pack. */
export function routeDetail({ basis, words }: Pick<RouteRow, 'basis' | 'words'>): string {
  return [basis ? capital(basisWords[basis]) : '', words ?? ''].filter(Boolean).join('. ')
}

const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1)

export const stateWords: Record<RouteRow['state'], string> = {
  scheduled: 'Day agreed',
  weather_hold: 'On hold for weather',
  ready: 'Ready to send',
}

export const paidWords = ({ balancePaid }: Pick<RouteRow, 'balancePaid'>) =>
  balancePaid ? 'Paid' : 'Balance open'

/** "3 orders, 4 boxes, 1 not safe". */
export function dayTotals(rows: readonly RouteRow[]): string {
  const boxes = rows.reduce((sum, row) => sum + row.boxes, 0)
  const bad = rows.filter(({ verdict }) => verdict === 'unsafe').length
  const parts = [
    rows.length === 1 ? '1 order' : `${rows.length} orders`,
    boxes === 1 ? '1 box' : `${boxes} boxes`,
    bad > 0 ? `${bad} not safe` : '',
  ]
  return parts.filter(Boolean).join(', ')
}

/** Ways that a look is of use for: what is on hold waits for the buyer's answer. */
export const openRows = (rows: readonly RouteRow[]) => rows.filter(({ state }) => state !== 'weather_hold')

/** What looking again at the ways of a day has brought, in a line. */
export function checkedWords({ rows, held }: { rows: readonly RouteRow[]; held: number }): string {
  const count = openRows(rows).length + held
  const looked = `Looked at ${count === 1 ? '1 way' : `${count} ways`}`
  if (held > 0) return `${looked}; ${held} held, and the buyers told.`
  const bad = openRows(rows).filter(({ verdict }) => verdict === 'unsafe').length
  return bad > 0 ? `${looked}: ${bad} not safe.` : `${looked}: none to be held.`
}
