import type { FieldProblem } from '@/shared/api/problem'
import type { FishBody } from '@/shared/contracts/fish-batch'
import type { ListingBody } from '@/shared/contracts/listings'
import type { ProduceBody } from '@/shared/contracts/produce-lot'

const DAY_MS = 86_400_000
const WATER_DAYS = 14
/** House rule: a batch looks different after two months. */
const PHOTO_DAYS = 60

const daysBetween = (earlier: string, later: string) =>
  Math.round((Date.parse(later) - Date.parse(earlier)) / DAY_MS)

function hatchFaults(body: FishBody, today: string): FieldProblem[] {
  const { hatchedOn, readyOn } = body
  const faults: FieldProblem[] = []
  if (hatchedOn > today && !readyOn) {
    faults.push({ detail: 'Not hatched yet: say when they will be ready.', pointer: '#/draft/readyOn' })
  }
  if (readyOn && readyOn < hatchedOn) {
    faults.push({ detail: 'They cannot be ready before they hatch.', pointer: '#/draft/readyOn' })
  }
  const early = body.windows.findIndex((window) => readyOn !== undefined && window.day < readyOn)
  if (early >= 0) {
    faults.push({
      detail: `The batch is ready on ${readyOn ?? ''}: offer pickup from that day on.`,
      pointer: `#/draft/windows/${early}/day`,
    })
  }
  return faults
}

function waterFaults({ water }: FishBody, today: string): FieldProblem[] {
  const pointer = '#/draft/water/measuredOn'
  if (water.measuredOn > today) return [{ detail: 'That day has not come yet.', pointer }]
  if (daysBetween(water.measuredOn, today) > WATER_DAYS) {
    return [{ detail: `Measure the water again: readings count for ${WATER_DAYS} days.`, pointer }]
  }
  return []
}

function photoFaults({ photos }: ListingBody, today: string): FieldProblem[] {
  return photos.flatMap((photo, at) => {
    const pointer = `#/draft/photos/${at}/takenOn`
    if (photo.takenOn > today) return [{ detail: 'That day has not come yet.', pointer }]
    const isOld = daysBetween(photo.takenOn, today) > PHOTO_DAYS
    return isOld
      ? [{ detail: `Take a new photo: this one is more than ${PHOTO_DAYS} days old.`, pointer }]
      : []
  })
}

/** House rule: what is cut in more than two weeks is not offered yet. */
const HARVEST_AHEAD_DAYS = 14

function harvestFaults({ harvest, sellBy }: ProduceBody, today: string): FieldProblem[] {
  if (daysBetween(today, harvest.day) > HARVEST_AHEAD_DAYS) {
    const detail = `Offer a harvest at most ${HARVEST_AHEAD_DAYS} days ahead.`
    return [{ detail, pointer: '#/draft/harvest/day' }]
  }
  if (sellBy !== undefined && sellBy < today) {
    const detail = `Its last day of sale was ${sellBy}. Was that the day of the harvest?`
    return [{ detail, pointer: '#/draft/harvest/day' }]
  }
  return []
}

function batchFaults(body: FishBody, today: string, onSale: ListingBody | null): FieldProblem[] {
  const isSameWater = onSale?.category === 'fish' && same(onSale.water, body.water)
  return [...hatchFaults(body, today), ...(isSameWater ? [] : waterFaults(body, today))]
}

const same = (one: unknown, other: unknown) => JSON.stringify(one) === JSON.stringify(other)

/**
 * Rules that need to know what day it is at the farm. Readings and photos are asked to be fresh when they are given,
 * not again each time a seller lowers a price: `onSale` is the version buyers see now.
 */
export function checkDates(body: ListingBody, today: string, onSale: ListingBody | null): FieldProblem[] {
  return [
    ...(body.category === 'fish' ? batchFaults(body, today, onSale) : []),
    ...(body.category === 'produce' ? harvestFaults(body, today) : []),
    ...(onSale && same(onSale.photos, body.photos) ? [] : photoFaults(body, today)),
  ]
}
