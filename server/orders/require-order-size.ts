import { Problem } from '@/shared/api/problem'
import type { ListingBody } from '@/shared/contracts/listings'
import { mostOrderCents } from '@/shared/domain/money/most-order-cents'
import { tierFor } from '@/shared/domain/money/tier-price'
import { MOST_BOXES, type BoxCharges } from '@/shared/domain/shipping/box-charges'
import { printCents } from '@/shared/units/money'

interface Size {
  quantity: number
  /** Absent: it is collected. */
  charges?: BoxCharges
  /** Where the count was asked for. */
  pointer: string
}

/** Refuses what is more than one order may be: boxes and freight count too. */
export function requireOrderSize({ tiers }: ListingBody, { quantity, charges, pointer }: Size): void {
  const refuse = (detail: string) =>
    new Problem('fields-invalid', undefined, { errors: [{ detail, pointer }] })
  const { boxes, boxCents, freightCents } = charges ?? { boxes: 0, boxCents: 0, freightCents: 0 }
  const goodsCents = (tierFor(tiers, quantity)?.unitCents ?? 0) * quantity
  if (goodsCents + boxCents + freightCents > mostOrderCents)
    throw refuse(`One order may come to at most ${printCents(mostOrderCents)}. Ask for fewer.`)
  if (boxes > MOST_BOXES)
    throw refuse(`That would be ${boxes} boxes; one order goes in at most ${MOST_BOXES}. Ask for fewer.`)
}
