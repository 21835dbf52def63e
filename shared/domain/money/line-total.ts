import { roundHalfUp } from '@/shared/domain/money/round-half-up'

/** How a line is priced. A pack price (25 for $34.99) stays a pack price: it has no price for one. */
export type LinePrice =
  | { kind: 'each'; unitCents: number }
  | { kind: 'pack'; packCents: number; packCount: number }
  | { kind: 'weight'; centsPerLb: number }

/** Value in cents of the first `amount` of a line: a count, or hundredths of a pound for `weight`. */
export function lineTotalCents(price: LinePrice, amount: number): number {
  switch (price.kind) {
    case 'each':
      return roundHalfUp(price.unitCents * amount, 1)
    case 'pack':
      return roundHalfUp(price.packCents * amount, price.packCount)
    case 'weight':
      return roundHalfUp(price.centsPerLb * amount, 100)
  }
}

/** Value of the part between two amounts; parts taken one after another add up to the whole, to the cent. */
export function linePartCents(price: LinePrice, part: { from: number; to: number }): number {
  return lineTotalCents(price, part.to) - lineTotalCents(price, part.from)
}
