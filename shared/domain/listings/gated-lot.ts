import { findCrop } from '@/shared/domain/produce/find-crop'

/** A listing as far as the legal gate looks at it. */
export type GatedLot =
  | { category: 'fish' | 'worms'; taxonId: string; licenceNumbers: string }
  | { category: 'media' }
  | { category: 'produce'; cropId: string; words: string }

export interface Gated {
  /** null: no living thing that any rule is about. */
  taxonId: string | null
  /** Where the seller names licences and permits; a plant has no field of its own for them. */
  papers: string
  /** Living animals go to no state that is too far for them. */
  isAnimal: boolean
}

/** What the legal gate asks about. Of plants only those are judged that the species table watches. */
export function gateOf(lot: GatedLot): Gated {
  switch (lot.category) {
    case 'fish':
    case 'worms':
      return { taxonId: lot.taxonId, papers: lot.licenceNumbers, isAnimal: true }
    case 'media':
      return { taxonId: null, papers: '', isAnimal: false }
    case 'produce':
      return { taxonId: findCrop(lot.cropId)?.taxonId ?? null, papers: lot.words, isAnimal: false }
  }
}
