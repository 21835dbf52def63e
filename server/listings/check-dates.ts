import type { FieldProblem } from '@/shared/api/problem'
import type { ListingBody } from '@/shared/contracts/listings'

const DAY_MS = 86_400_000
const WATER_DAYS = 14
/** House rule: a batch looks different after two months. */
const PHOTO_DAYS = 60

const daysBetween = (earlier: string, later: string) =>
  Math.round((Date.parse(later) - Date.parse(earlier)) / DAY_MS)

function hatchFaults(body: ListingBody, today: string): FieldProblem[] {
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

function waterFaults({ water }: ListingBody, today: string): FieldProblem[] {
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

const same = (one: unknown, other: unknown) => JSON.stringify(one) === JSON.stringify(other)

/**
 * Rules that need to know what day it is at the farm. Readings and photos are asked to be fresh when they are given,
 * not again each time a seller lowers a price: `onSale` is the version buyers see now.
 */
export function checkDates(body: ListingBody, today: string, onSale: ListingBody | null): FieldProblem[] {
  return [
    ...hatchFaults(body, today),
    ...(onSale && same(onSale.water, body.water) ? [] : waterFaults(body, today)),
    ...(onSale && same(onSale.photos, body.photos) ? [] : photoFaults(body, today)),
  ]
}
