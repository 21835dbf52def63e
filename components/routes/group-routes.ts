import type { RouteRow } from '@/shared/contracts/ship-acts'

export interface RouteDay {
  shipDay: string
  rows: RouteRow[]
}

/** Orders to ship by the day on which they leave, soonest first; within a day as they came. */
export function groupRoutes(rows: readonly RouteRow[]): RouteDay[] {
  const days = new Map<string, RouteRow[]>()
  for (const row of rows) days.set(row.shipDay, [...(days.get(row.shipDay) ?? []), row])
  return [...days]
    .map(([shipDay, found]) => ({ shipDay, rows: found }))
    .sort((a, b) => (a.shipDay < b.shipDay ? -1 : 1))
}
