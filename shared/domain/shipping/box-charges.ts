export interface BoxTerms {
  /** What one packed box costs the buyer. */
  boxCents: number
  /** What the carrier takes for one box. */
  freightCents: number
  mostInBox: number
}

export interface BoxCharges {
  boxes: number
  boxCents: number
  freightCents: number
}

/** The most boxes of one order: nobody packs more in a morning. House rule. */
export const MOST_BOXES = 500

/** Boxes for a count of animals and what they come to, all boxes together. Throws RangeError below one animal or box size. */
export function boxCharges(quantity: number, { boxCents, freightCents, mostInBox }: BoxTerms): BoxCharges {
  if (!(Number.isInteger(quantity) && quantity > 0 && Number.isInteger(mostInBox) && mostInBox > 0)) {
    throw new RangeError(`no boxes for ${quantity} animals, ${mostInBox} in each`)
  }
  const boxes = Math.ceil(quantity / mostInBox)
  return { boxes, boxCents: boxes * boxCents, freightCents: boxes * freightCents }
}
