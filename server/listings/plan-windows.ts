import type { ResolvedWindow } from '@/server/listings/resolve-windows'
import type { WindowRow } from '@/server/listings/window-store'
import { windowWords } from '@/server/listings/window-words'

export interface WindowPlan {
  add: ResolvedWindow[]
  change: { id: number; capacity: number }[]
  close: number[]
  /** What buyers who hold places stand in the way of, in sentences that name the window. */
  problems: string[]
}

const sameTime = (row: WindowRow, wanted: ResolvedWindow) =>
  +row.startsAt === +wanted.startsAt && +row.endsAt === +wanted.endsAt

const buyers = (count: number) => (count === 1 ? '1 buyer has' : `${count} buyers have`)

/**
 * From the windows there are to the windows wanted. What has begun stays as it is. A window in which buyers hold
 * places neither vanishes nor moves nor shrinks below them: it is kept, and said so.
 */
export function planWindows(existing: WindowRow[], wanted: ResolvedWindow[], at: Date): WindowPlan {
  const plan: WindowPlan = { add: [], change: [], close: [], problems: [] }
  for (const window of wanted) {
    const row = existing.find((one) => sameTime(one, window))
    if (!row) {
      if (window.startsAt > at) plan.add.push(window)
      else plan.problems.push('A pickup window that is over cannot be offered: choose a later day.')
    } else if (row.startsAt > at) {
      if (window.capacity < row.taken) {
        plan.problems.push(
          `${buyers(row.taken)} a place in ${windowWords(row.startsAt, row.zone)}: it cannot hold fewer.`,
        )
      }
      plan.change.push({ id: row.id, capacity: Math.max(window.capacity, row.taken) })
    }
  }
  const dropped = existing.filter(
    (row) => row.startsAt > at && row.closed === 0 && !wanted.some((window) => sameTime(row, window)),
  )
  for (const row of dropped) {
    if (row.taken === 0) plan.close.push(row.id)
    else {
      plan.problems.push(
        `${buyers(row.taken)} a place in ${windowWords(row.startsAt, row.zone)}: it cannot be moved or taken away.`,
      )
    }
  }
  return plan
}
