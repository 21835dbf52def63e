import type { SeasonWeek } from '@/server/listings/season-week'
import type { FishBody } from '@/shared/contracts/fish-batch'
import type { ListingBody } from '@/shared/contracts/listings'
import type { ShippedThroughYear, ShippedTo } from '@/shared/contracts/shipping'
import type { CellPoint } from '@/shared/domain/geo/location-cell'
import { statesServed } from '@/shared/domain/listings/states-served'
import { findState } from '@/shared/domain/rules/find-state'
import { nextSafeWeek, seasonAt, seasonStrip } from '@/shared/domain/season/season-at'
import { shipmentOf } from '@/shared/domain/season/shipment-of'
import { comingMonday } from '@/shared/times/coming-monday'

interface Way {
  body: ListingBody | Pick<FishBody, 'category' | 'taxonId' | 'shipping' | 'statesServed'>
  from: CellPoint
  to: { centre: CellPoint; state: string }
  /** What the legal gate says of that state. */
  status: string
  when: SeasonWeek
}

const isSafe = (verdict: string) => verdict === 'safe' || verdict === 'safe-with-packs'

function wayOf({ body, from, to }: Way) {
  if (body.category !== 'fish' || !body.shipping) return null
  return shipmentOf({ taxonId: body.taxonId, packing: body.shipping.packing, from }, to.centre)
}

/** The states the seller names, without those in which it must not be shown: as search rows hold them. */
const isServed = ({ body, to, status }: Way) =>
  status !== 'prohibited' &&
  findState(to.state)?.takesAnimals === true &&
  (statesServed(body)?.includes(to.state) ?? false)

/** Whether it may be shipped to a place in a week; undefined: this batch is not shipped. */
export function presentShipped(way: Way): ShippedTo | undefined {
  const shipment = wayOf(way)
  if (!shipment) return undefined
  const { week, monday, isThisWeek } = way.when
  const { verdict } = seasonAt(shipment, week)
  const next = isSafe(verdict) ? null : nextSafeWeek(shipment, week)
  return {
    isServed: isServed(way),
    verdict,
    monday,
    isThisWeek,
    ...(next === null ? {} : { nextMonday: comingMonday(monday, next) }),
  }
}

/** The same with all weeks of the year. */
export function presentShippedThroughYear(way: Way): ShippedThroughYear | undefined {
  const [shipped, shipment] = [presentShipped(way), wayOf(way)]
  if (!shipped || !shipment) return undefined
  const weeks = seasonStrip(shipment).map(({ verdict }) => verdict)
  return { ...shipped, week: way.when.week, weeks }
}
