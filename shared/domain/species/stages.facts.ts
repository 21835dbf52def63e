import type { SourceKey } from '@/shared/sources'

export interface Stage {
  id: 'fry' | 'fingerling' | 'advanced-fingerling' | 'juvenile' | 'adult' | 'breeder'
  name: string
  /** Usual total length of food and pond fish, inches; null where length does not decide. */
  fromIn: number | null
  toIn: number | null
  meaning: string
  sourceKey: SourceKey
}

// Sellers stretch these words (half-inch fish sold as fingerlings is a known complaint), so a screen always prints
// the inches beside the word. The 4 in edge and the two lower edges are trade usage; the rest is our reading.
export const stages: readonly Stage[] = [
  {
    id: 'fry',
    name: 'Fry',
    fromIn: 0,
    toIn: 1,
    meaning: 'Free-swimming young, up to about 1 inch.',
    sourceKey: 'trade-practice',
  },
  {
    id: 'fingerling',
    name: 'Fingerling',
    fromIn: 1,
    toIn: 4,
    meaning: 'Young fish of about 1 to 4 inches.',
    sourceKey: 'trade-practice',
  },
  {
    id: 'advanced-fingerling',
    name: 'Advanced fingerling',
    fromIn: 4,
    toIn: 8,
    meaning: 'Young fish past about 4 inches.',
    sourceKey: 'trade-practice',
  },
  {
    id: 'juvenile',
    name: 'Juvenile',
    fromIn: 1,
    toIn: null,
    meaning: 'Past the larval form, not yet able to breed. Used for crayfish and prawns too.',
    sourceKey: 'house-rule',
  },
  {
    id: 'adult',
    name: 'Adult',
    fromIn: null,
    toIn: null,
    meaning: 'Full grown for its kind.',
    sourceKey: 'house-rule',
  },
  {
    id: 'breeder',
    name: 'Breeder',
    fromIn: null,
    toIn: null,
    meaning: 'Adult kept for, or sold for, spawning.',
    sourceKey: 'house-rule',
  },
]
