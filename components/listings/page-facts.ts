import { animalWord } from './animal-words'
import { pickupDay } from './pickup-words'
import { stageName } from './stage-words'
import { canBeShipped, shippingBadge } from './shipping-words'
import type { TagBadge, TagFacts } from './tag-facts'

import { legalWords } from '@/components/rules/legal-words'
import type { ShownListing } from '@/shared/contracts/listings'
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
    sizeText: printLengthRange({ minCm: body.sizeLoMm / 10, maxCm: body.sizeHiMm / 10 }, units),
    stage: stageName(body.stage),
    countText: `${printCount(listing.free)} left`,
    waterText: printBothTemperatures(body.water.temperatureC, units),
    priceText: printCents(tierFor(body.tiers, count)?.unitCents ?? 0),
    priceUnitText: `a ${animalWord(body.taxonId, 1)}, for ${printCount(count)}`,
    distanceText:
      distanceKm === undefined ? undefined : `${aboutDistance(distanceKm, units)} ${bearing ?? ''}`.trim(),
    placeText: seller.placeText,
    dayText: next ? pickupDay(next) : undefined,
    badges: badges(listing),
  }
}

function badges({ body, gate, shipped }: ShownListing): TagBadge[] {
  const legal = gate ? [legalWords(gate.status, gate.buyerState)] : []
  if (!body.shipping) return legal
  return [...legal, shipped && gate ? shippingBadge(shipped, gate.buyerState) : canBeShipped]
}
