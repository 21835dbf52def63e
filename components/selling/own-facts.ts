import { kindOf } from './kind-of'
import { ownBadges } from './own-state-words'

import { categoryIcons } from '@/components/find/found-facts'
import { pickupDay } from '@/components/listings/pickup-words'
import { photoUrl } from '@/hooks/api'
import type { OwnListing } from '@/shared/contracts/listings'
import { readUnit } from '@/shared/domain/listings/read-unit'
import { soldAs, unitNoun } from '@/shared/domain/listings/unit-words'
import { printCount } from '@/shared/units/count'
import { printLengthRange } from '@/shared/units/length'
import { printCents } from '@/shared/units/money'
import { printBothTemperatures } from '@/shared/units/temperature'
import type { UnitSystem } from '@/shared/units/unit-system'

import type { TagFacts } from '@/components/listings/tag-facts'

const number = (value: unknown) => (typeof value === 'number' ? value : undefined)
const part = (value: unknown, key: string): unknown =>
  typeof value === 'object' && value !== null ? (value as Record<string, unknown>)[key] : undefined
const first = (value: unknown): unknown => (Array.isArray(value) ? value[0] : undefined)

/** A seller's own listing as its tag reads; a draft may lack any part of it. */
export function ownFacts(own: OwnListing, units: UnitSystem): TagFacts {
  const { draft, stock } = own
  const lo = number(draft.sizeLoMm)
  const hi = number(draft.sizeHiMm)
  const waterC = number(part(draft.water, 'temperatureC'))
  const cents = number(part(first(draft.tiers), 'unitCents'))
  const photo = part(first(draft.photos), 'photoId')
  const next = own.windows[0]
  const kind = kindOf(own)
  const fishSize =
    lo && hi && hi >= lo ? printLengthRange({ minCm: lo / 10, maxCm: hi / 10 }, units) : 'size to come'
  const unit = kind === 'fish' ? null : readUnit(draft)
  return {
    title: own.title,
    sizeText: kind === 'fish' ? fishSize : unit ? soldAs(unit, manyOf(draft)) : 'unit to come',
    countText:
      own.liveVersion === undefined ? plannedCount(draft.countOnHand) : `${printCount(stock.free)} free`,
    waterText: waterC === undefined ? undefined : printBothTemperatures(waterC, units),
    priceText: cents === undefined ? '$ ?' : printCents(cents),
    priceUnitText: kind === 'fish' ? 'a fish' : unit ? `a ${unitNoun(unit, 1)}` : 'each',
    placeText: orderWords(own.openOrders),
    dayText: next ? `Next pickup ${pickupDay(next)}` : undefined,
    photoUrl: typeof photo === 'string' ? photoUrl(photo, 320) : undefined,
    icon: categoryIcons[kind],
    badges: ownBadges(own),
    href: hrefOf(own),
  }
}

const manyOf = ({ taxonId }: OwnListing['draft']) =>
  taxonId === 'black_soldier_fly_larvae' ? 'larvae' : 'worms'

const plannedCount = (count: unknown) => (typeof count === 'number' ? printCount(count) : 'count to come')

function orderWords(openOrders: number): string {
  if (openOrders === 0) return 'No open orders'
  return openOrders === 1 ? '1 open order' : `${openOrders} open orders`
}

/** What was never on sale opens in its form; what was, on the page it is looked after from. */
function hrefOf({ listingId, liveVersion }: OwnListing): TagFacts['href'] {
  const pathname =
    liveVersion === undefined ? '/sell/listings/[listingId]' : '/sell/listings/[listingId]/manage'
  return { pathname, params: { listingId } }
}
