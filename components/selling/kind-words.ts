import type { Category } from '@/components/find/find-params'

interface KindWords {
  /** On the choice. */
  label: string
  /** "Like an earlier …". */
  earlier: string
  takenOver: string
  begin: string
  atHand: string
}

export const kindWords: Record<Category, KindWords> = {
  fish: {
    label: 'Fish',
    earlier: 'Like an earlier batch',
    takenOver:
      'Species, prices, terms and words are taken over. Count, dates, health, photos and pickup windows are asked anew.',
    begin: 'Begin with an empty form',
    atHand:
      'Have at hand: the count, a photo with a ruler beside the fish, and a water test not older than 14 days. It saves itself, so you can stop and go on later.',
  },
  produce: {
    label: 'Produce',
    earlier: 'The same again',
    takenOver: 'Crop, price and terms are taken over, with a new lot code and today’s harvest.',
    begin: 'Another crop',
    atHand:
      'Two minutes: crop, count, price, when people come, and a photo. How you grow and handle it is remembered.',
  },
  worms: {
    label: 'Worms',
    earlier: 'Like an earlier lot',
    takenOver: 'Kind, packs, price and terms are taken over. Look through the new lot before you list it.',
    begin: 'Begin with an empty form',
    atHand: 'Have at hand: what one pack holds, and a look through the lot for jumping worms.',
  },
  media: {
    label: 'Media',
    earlier: 'Like an earlier listing',
    takenOver: 'Material, bag, price and terms are taken over.',
    begin: 'Begin with an empty form',
    atHand:
      'Have at hand: what one bag holds and weighs. A handful in vinegar tells whether it changes the pH.',
  },
}
