import { animalWord } from './animal-words'
import { pickupDay } from './pickup-words'
import { stageName } from './stage-words'
import { canBeShipped, shippingBadge } from './shipping-words'
import type { TagBadge, TagFacts } from './tag-facts'

import { legalWords } from '@/components/rules/legal-words'
import type { ShownListing } from '@/shared/contracts/listings'
import { thingsOf, unitWordOf } from '@/shared/domain/listings/count-words'
import { lotSize } from '@/shared/domain/listings/lot-size'
import { printSaleUnit } from '@/shared/domain/listings/sale-unit'
import { shippingOf } from '@/shared/domain/listings/shipping-of'
import { tierFor } from '@/shared/domain/money/tier-price'
import { printCount } from '@/shared/units/count'
import { aboutDistance } from '@/shared/units/distance'
import { printLengthRange } from '@/shared/units/length'
import { printCents } from '@/shared/units/money'
import { printBothTemperatures } from '@/shared/units/temperature'
import type { UnitSystem } from '@/shared/units/unit-system'

interface Asked {
  units: UnitSystem
  count: number
}

/** A listing as the tag at the head of its own page reads. */
export function pageFacts(listing: ShownListing, { units, count }: Asked): TagFacts {
  const { body, seller, distanceKm, bearing } = listing
  const next = listing.windows.find(({ placesLeft }) => placesLeft > 0)
  return {
    title: listing.title,
    countText: `${printCount(listing.free)} left`,
    ...kindFacts(body, units),
    priceText: printCents(tierFor(body.tiers, count)?.unitCents ?? 0),
    priceUnitText: `a ${body.category === 'fish' ? animalWord(body.taxonId, 1) : unitWordOf(body)}, for ${printCount(count)}`,
    distanceText:
      distanceKm === undefined ? undefined : `${aboutDistance(distanceKm, units)} ${bearing ?? ''}`.trim(),
    placeText: seller.placeText,
    dayText: next ? pickupDay(next) : undefined,
    badges: badges(listing),
  }
}

/** Size, stage and water of fish; of everything else what one unit is. */
function kindFacts(body: ShownListing['body'], units: UnitSystem) {
  const size = lotSize(body)
  if (body.category !== 'fish' || !size) {
    return { sizeText: body.category === 'fish' ? '' : printSaleUnit(body.saleUnit, thingsOf(body)) }
  }
  return {
    sizeText: printLengthRange({ minCm: size.loMm / 10, maxCm: size.hiMm / 10 }, units),
    stage: stageName(body.stage),
    waterText: printBothTemperatures(body.water.temperatureC, units),
  }
}

function badges({ body, gate, shipped }: ShownListing): TagBadge[] {
  const legal = gate ? [legalWords(gate.status, gate.buyerState)] : []
  if (!shippingOf(body)) return legal
  return [...legal, shipped && gate ? shippingBadge(shipped, gate.buyerState) : canBeShipped]
}
