import { animalWord } from '@/components/listings/animal-words'
import type { TagBadge, TagFacts } from '@/components/listings/tag-facts'
import { pickupDay } from '@/components/listings/pickup-words'
import { canBeShipped, shippingBadge } from '@/components/listings/shipping-words'
import { stageName } from '@/components/listings/stage-words'
import { legalWords } from '@/components/rules/legal-words'
import { photoUrl } from '@/hooks/api'
import type { SellerListing } from '@/shared/contracts/search'
import { printCount } from '@/shared/units/count'
import { aboutDistance } from '@/shared/units/distance'
import { printLengthRange } from '@/shared/units/length'
import { printCents } from '@/shared/units/money'
import { printBothTemperatures } from '@/shared/units/temperature'
import type { UnitSystem } from '@/shared/units/unit-system'
import type { IconName } from '@/components/ui/icon-paths'

import type { Category } from './find-params'

interface Asked {
  units: UnitSystem
  /** How many the buyer wants. */
  count: number | undefined
  /** Where the animals would live; undefined: not said, so neither distance nor law is known. */
  state: string | undefined
  /** Carried by the link when it is not the place in use. */
  near: string | undefined
}

export const categoryIcons: Record<Category, IconName> = {
  fish: 'fish',
  worms: 'worm',
  media: 'media',
  produce: 'leaf',
}

/** A found listing as its tag reads; on a seller's page the reader's place may not be known. */
export function foundFacts(found: SellerListing, asked: Asked): TagFacts {
  const { units, count, state, near } = asked
  const isTotal = count !== undefined && found.totalCents !== undefined
  return {
    title: found.title,
    scientificName: found.scientificName,
    sizeText: sizeText(found, units),
    stage: stageName(found.stage),
    countText: `${printCount(found.free)} left`,
    waterText: found.waterC === undefined ? undefined : printBothTemperatures(found.waterC, units),
    priceText: printCents(isTotal ? (found.totalCents ?? 0) : found.unitCents),
    priceUnitText: isTotal
      ? `for ${printCount(count)}`
      : found.category === 'fish'
        ? `a ${animalWord(found.speciesId, 1)}`
        : 'each',
    distanceText: state ? distanceText(found, units) : undefined,
    placeText: found.placeText,
    dayText: found.nextPickup ? `Pickup ${pickupDay(found.nextPickup)}` : undefined,
    photoUrl: found.photo ? photoUrl(found.photo.photoId, 320) : undefined,
    photoText: found.photo?.alt,
    icon: categoryIcons[found.category],
    badges: badges(found, asked),
    href: {
      pathname: '/listings/[listingId]',
      params: {
        listingId: found.listingId,
        ...(count ? { count: String(count) } : {}),
        ...(near ? { near } : {}),
      },
    },
  }
}

// Both in one cell: there is no direction to tell.
function distanceText({ distanceKm, bearing }: SellerListing, units: UnitSystem): string | undefined {
  if (distanceKm === undefined) return undefined
  const about = aboutDistance(distanceKm, units)
  return bearing === undefined || bearing === 'here' ? about : `${about} ${bearing}`
}

function sizeText({ sizeLoMm, sizeHiMm }: SellerListing, units: UnitSystem): string {
  if (sizeLoMm === undefined || sizeHiMm === undefined) return ''
  return printLengthRange({ minCm: sizeLoMm / 10, maxCm: sizeHiMm / 10 }, units)
}

function badges(found: SellerListing, { count, state }: Asked): TagBadge[] {
  const told: TagBadge[] = []
  if (state && found.legal) told.push(legalWords(found.legal.status, state))
  if (found.rating) {
    const { mean, count: ratings } = found.rating
    told.push({ word: `${mean.toFixed(1)} of 5 (${printCount(ratings)})`, tone: 'neutral', icon: 'star' })
  }
  if (!count && found.minOrder > 1)
    told.push({ word: `From ${printCount(found.minOrder)} up`, tone: 'neutral' })
  if (found.shipped) told.push(state ? shippingBadge(found.shipped, state) : canBeShipped)
  return told
}
