import type { LetterBlock } from '@/server/mail/letter'
import type { ListingBody } from '@/shared/contracts/listings'
import { fillCaution } from '@/shared/domain/rules/fill-caution'

export const caution = (text: string): LetterBlock => ({ kind: 'caution', text })

const bring: Record<ListingBody['category'], string> = {
  fish: 'Bring a lidded bucket or cooler half full of your own tank water, never fresh tap water, and go straight home.',
  worms:
    'Bring a cooler or a shaded box, keep it out of the sun and go straight home: a parked car is too hot.',
  media: 'Bring a car that bears the weight, and somebody to help lift.',
  produce: 'Bring a cooler with an ice pack, and go straight home.',
}

/** What a buyer brings along to a pickup. */
export const bringWords = ({ category }: ListingBody): string => bring[category]

/** What a buyer reads once it is theirs. */
export function careCautions({ category }: ListingBody): LetterBlock[] {
  switch (category) {
    case 'fish':
      return [fillCaution('G-8', { hours: '6' }), fillCaution('G-7', {}), fillCaution('G-1', {})].map(caution)
    case 'worms':
      return [caution(fillCaution('G-1', {}))]
    case 'produce':
      return [caution(fillCaution('G-9', {}))]
    case 'media':
      return []
  }
}
