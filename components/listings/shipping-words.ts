import type { TagBadge } from './tag-facts'

import type { ShipDay } from '@/shared/domain/shipping/ship-days'
import type { ShippedTo } from '@/shared/contracts/shipping'

export const shipDayNames: Record<ShipDay, string> = { mon: 'Monday', tue: 'Tuesday', wed: 'Wednesday' }

export const canBeShipped: TagBadge = { word: 'Can be shipped', tone: 'neutral', icon: 'truck' }

/** "Apr 13" for an ISO day. */
export function shortDay(day: string): string {
  const noon = new Date(`${day}T12:00:00Z`)
  return noon.toLocaleDateString('en-US', { month: 'short', day: 'numeric', timeZone: 'UTC' })
}

/** Whether it arrives alive in the state `to`, in a line: the verdict of the season strip in words. */
export function shippingBadge({ isServed, verdict, ...week }: ShippedTo, to: string): TagBadge {
  if (!isServed) return { word: `Not shipped to ${to}`, tone: 'neutral', icon: 'truck' }
  const when = week.isThisWeek ? 'this week' : `in the week of ${shortDay(week.monday)}`
  if (verdict === 'safe') return { word: `Ships to you ${when}`, tone: 'safe' }
  if (verdict === 'safe-with-packs')
    return { word: `Ships to you ${when}, with packs`, tone: 'info', icon: 'truck' }
  if (verdict === 'unknown')
    return { word: 'Shipping weather not known here', tone: 'neutral', icon: 'truck' }
  const isCold = verdict === 'too-cold'
  const next = week.nextMonday
    ? `next safe week: ${shortDay(week.nextMonday)}`
    : 'no week of the year is safe'
  return { word: `Too ${isCold ? 'cold' : 'hot'} to ship ${when}; ${next}`, tone: isCold ? 'cold' : 'hot' }
}
