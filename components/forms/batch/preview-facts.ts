import { figures } from '@/components/forms/figure'
import { canBeShipped } from '@/components/listings/shipping-words'
import { stageName } from '@/components/listings/stage-words'
import { printDay } from '@/components/forms/day-text'
import { photoUrl } from '@/hooks/api'
import { listingTitle } from '@/shared/domain/listings/listing-title'
import { findTaxon } from '@/shared/domain/species/find-taxon'
import { printCount } from '@/shared/units/count'
import { printLengthRange } from '@/shared/units/length'
import { printCents } from '@/shared/units/money'
import { printBothTemperatures } from '@/shared/units/temperature'

import type { BatchTyping } from './batch-typing'
import type { TagFacts } from '@/components/listings/tag-facts'
import type { UnitSystem } from '@/shared/units/unit-system'

interface Options {
  units: UnitSystem
  placeText: string
}

/** The tag as buyers will see it, from what is typed so far. What is missing is left open, never made up. */
export function previewFacts(typing: BatchTyping, { units, placeText }: Options): TagFacts {
  const taxon = findTaxon(typing.taxonId)
  const count = figures.count.read(typing.countOnHand)
  const waterC = figures.temperatureC.read(typing.water.temperatureC, units)
  const photo = typing.photos[0]
  const day = typing.windows
    .map((window) => window.day)
    .filter(Boolean)
    .sort()[0]
  return {
    title: taxon ? listingTitle({ ...typing, strain: typing.strain || undefined }) : 'Your batch',
    scientificName: taxon?.scientificName,
    sizeText: sizeText(typing, units),
    stage: stageName(typing.stage),
    countText: count === null ? 'how many?' : `${printCount(count)} left`,
    waterText: waterC === null ? undefined : printBothTemperatures(waterC, units),
    ...priceText(typing),
    placeText,
    dayText: day ? `Pickup ${printDay(day)}` : undefined,
    photoUrl: photo ? photoUrl(photo.photoId, 800) : undefined,
    photoText: photo?.caption || undefined,
    icon: 'fish',
    badges: typing.shipping.isOffered ? [canBeShipped] : [],
  }
}

function sizeText({ sizeLoMm, sizeHiMm }: BatchTyping, units: UnitSystem): string {
  const lo = figures.batchLengthMm.read(sizeLoMm, units)
  const hi = figures.batchLengthMm.read(sizeHiMm, units)
  if (lo === null || hi === null || hi < lo) return 'what size?'
  return printLengthRange({ minCm: lo / 10, maxCm: hi / 10 }, units)
}

/** The price of the smallest order, as in the search results; that more fish cost less stands beside it. */
function priceText({ tiers }: BatchTyping): Pick<TagFacts, 'priceText' | 'priceUnitText'> {
  const prices = tiers.flatMap((tier) => figures.cents.read(tier.unitCents) ?? [])
  const first = prices[0]
  if (first === undefined) return { priceText: '$ ?', priceUnitText: 'a fish' }
  return {
    priceText: printCents(first),
    priceUnitText: prices.length > 1 ? 'a fish, less for more' : 'a fish',
  }
}
