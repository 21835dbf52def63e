import { chances, type Chances } from '@/tests/bench/chances'
import { buyers, countSpecies, PAGE, shippedTo } from '@/tests/bench/make-query'
import { TODAY } from '@/tests/bench/make-listings'
import type { MadeListings } from '@/tests/bench/made-listings'
import type { SearchQuery } from '@/server/search/search-query'

/** The same question twice: place, species, radius and sort alike, once for what is safely shipped in a week. */
export interface Pair {
  kind: PairKind
  plain: SearchQuery
  shipped: SearchQuery
}

export const pairKinds = {
  species: 'nearest of a species, 50 to 200 km, count and price cap',
  nearest: 'nearest of a category, 160 km',
  cheapest: 'cheapest of a category, 200 km',
  soonest: 'soonest of a category within two weeks, 200 km',
  rated: 'best rated of a category, anywhere',
} as const
export type PairKind = keyof typeof pairKinds

/** Pairs of each kind in turn. Only animals are shipped, so only animals are asked for. */
export function seasonPairs(made: MadeListings, seed: number): () => Pair {
  const chance: Chances = chances(seed)
  const buyer = buyers(chance)
  const { speciesOf } = countSpecies(made)
  const animals = () => chance.pick([1, 1, 1, 2])
  const make: Record<PairKind, () => Omit<SearchQuery, 'origin' | 'buyerState' | 'limit'>> = {
    species: () => {
      const categoryCode = animals()
      const species = speciesOf(categoryCode)
      return {
        sort: 'nearest',
        categoryCode,
        // Buyers want what is offered most: the square leans towards the first of the list.
        speciesCode: species[Math.floor(chance.next() ** 2 * species.length)],
        radiusKm: chance.pick([50, 100, 200]),
        count: chance.pick([1, 10, 25, 50]),
        mostCents: categoryCode === 1 ? 160 : 1300,
      }
    },
    nearest: () => ({ sort: 'nearest', categoryCode: animals(), radiusKm: 160 }),
    cheapest: () => ({ sort: 'cheapest', categoryCode: animals(), radiusKm: 200 }),
    soonest: () => {
      const from = TODAY + chance.between(0, 14)
      return { sort: 'soonest', categoryCode: animals(), radiusKm: 200, days: { from, until: from + 13 } }
    },
    rated: () => ({ sort: 'best-rated', categoryCode: animals(), radiusKm: 4000 }),
  }
  const kinds = Object.keys(make) as PairKind[]
  let asked = 0
  return () => {
    const kind = kinds[asked++ % kinds.length] ?? 'species'
    const plain: SearchQuery = { ...buyer(), ...make[kind](), limit: PAGE }
    return { kind, plain, shipped: { ...plain, shipped: shippedTo(plain, chance) } }
  }
}
