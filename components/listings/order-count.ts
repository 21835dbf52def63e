import type { ListingBody } from '@/shared/contracts/listings'

export interface CountLimits {
  least: number
  step: number
  most: number
}

/** What may be ordered from a batch with so many free: from the smallest order on, in steps. */
export function countLimits(body: ListingBody, free: number): CountLimits {
  return { least: body.minOrder, step: body.orderStep, most: Math.min(free, body.mostPerBuyer ?? free) }
}

/** The closest count that may be ordered. null: not even the smallest order is left. */
export function fitCount(wanted: number, { least, step, most }: CountLimits): number | null {
  if (most < least) return null
  const highest = least + Math.floor((most - least) / step) * step
  const stepped = least + Math.round((wanted - least) / step) * step
  return Math.min(highest, Math.max(least, stepped))
}
