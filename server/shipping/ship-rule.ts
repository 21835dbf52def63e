import { now } from '@/server/clock'
import { dayOf } from '@/server/listings/day-of'
import { noShipDaysFrom } from '@/server/shipping/no-ship-days'
import type { BatchShipping, FishBody } from '@/shared/contracts/fish-batch'
import { dateAfter } from '@/shared/domain/calendar/day-number'
import { packingClasses } from '@/shared/domain/season/season-classes.facts'
import { FASTING_DAYS } from '@/shared/domain/shipping/fasting-days'
import type { ShipDayRule } from '@/shared/domain/shipping/ship-days'

/** How a batch is shipped; a batch that is collected only is an error of ours by then. */
export function shippingOf({ shipping }: Pick<FishBody, 'shipping'>): BatchShipping {
  if (!shipping) throw new Error('this batch is not shipped')
  return shipping
}

/** The days on which this batch may leave, by the carriers' calendar from a day on. */
export async function shipRuleOf(terms: FishBody, fromDay: string): Promise<ShipDayRule> {
  const { packing, days } = shippingOf(terms)
  return { days, nights: packingClasses[packing].nights, noShipDays: await noShipDaysFrom(fromDay) }
}

/** Today by the seller's calendar. */
export const sellersToday = (zone: string): string => dayOf(now(), zone)

/** The first day that may still be chosen: animals not ready yet do not leave before they are. */
export function firstShipDay({ readyOn }: Pick<FishBody, 'readyOn'>, zone: string): string {
  const soonest = dateAfter(sellersToday(zone), FASTING_DAYS)
  return readyOn !== undefined && readyOn > soonest ? readyOn : soonest
}
