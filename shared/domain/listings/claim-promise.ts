import { clocks } from '@/shared/domain/orders/clocks.facts'

export interface ArrivalPromise {
  windowHours: number
  survivalDays: number
  remedy: 'refund' | 'replace'
  evidence: string
}

/** A listing as far as its promise goes. Media and produce carry none of their own. */
export type PromisingLot =
  { category: 'fish' | 'worms'; promise: ArrivalPromise } | { category: 'media' | 'produce' }

/** null: nothing alive is promised. */
export function promiseOf(lot: PromisingLot): ArrivalPromise | null {
  return lot.category === 'fish' || lot.category === 'worms' ? lot.promise : null
}

/** House rule: what is not alive is looked at when it is handed over, so the shortest lawful window. Hours. */
const GOODS_WINDOW_HOURS = clocks.claimWindowLeast.minutes / 60

/** How long a buyer may report what is wrong, in hours after the hand-over. */
export function claimWindowHours(lot: PromisingLot): number {
  return promiseOf(lot)?.windowHours ?? GOODS_WINDOW_HOURS
}
