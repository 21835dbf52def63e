import { cellAt, cellCentre } from '@/shared/domain/geo/location-cell'
import { weighted, type Chances } from '@/tests/bench/chances'
import { cities } from '@/tests/bench/cities'
import { SPECIES_CODES, TODAY } from '@/tests/bench/make-listings'
import type { MadeListings } from '@/tests/bench/made-listings'
import { safeLanesTo } from '@/server/search/safe-lanes-to'
import type { SearchQuery, SearchSort } from '@/server/search/search-query'

export const PAGE = 24

export type Shape = 'A' | 'B' | 'C' | 'D' | 'E' | 'F' | 'G' | 'H'

export const shapes: Record<Shape, string> = {
  A: 'typical: category and species, 50 to 200 km, count, price cap, pickup or ship',
  B: 'broad: category, 500 km',
  C: 'rare: species under 0.8 %, ship only, 50 and more, price cap, 500 km',
  D: 'local: no category named, 25 km, pickup',
  E: 'cheapest of a category in 200 km',
  F: 'soonest of a category in 200 km, within two weeks',
  G: 'best rated of a category, anywhere',
  H: 'as A, but shipped to the buyer in a week',
}

/** Draws a buyer: a town by its people, a little out of it, as a cell. */
export function buyers(chance: Chances): () => Pick<SearchQuery, 'origin' | 'buyerState'> {
  const town = weighted(
    cities.map(({ population }) => population),
    chance,
  )
  return () => {
    const city = cities[town()]
    if (!city) throw new RangeError('no such town')
    const near = {
      lat: city.place.lat + chance.normal() * 0.15,
      lng: city.place.lng + chance.normal() * 0.15,
    }
    const cell = cellAt(near, 50)
    if (!cell) throw new RangeError('not on Earth')
    return { origin: cellCentre(cell), buyerState: city.state }
  }
}

const anyWeek = (chance: Chances) => chance.between(1, 52)

/** The season filter as the product reads it: to the buyer, in some week of the year. */
export function shippedTo(
  { origin, buyerState }: Pick<SearchQuery, 'origin' | 'buyerState'>,
  chance: Chances,
): NonNullable<SearchQuery['shipped']> {
  return { lanes: safeLanesTo(origin, anyWeek(chance)), state: buyerState ?? 'OH' }
}

interface Counted {
  speciesOf: (categoryCode: number) => number[]
  rare: number[]
}

export function countSpecies(made: MadeListings): Counted {
  const counts = new Map<number, { n: number; category: number }>()
  for (let at = 0; at < made.count; at++) {
    const code = made.species[at] ?? 0
    const known = counts.get(code) ?? { n: 0, category: made.category[at] ?? 0 }
    known.n++
    counts.set(code, known)
  }
  counts.delete(0)
  const all = [...counts]
  return {
    speciesOf: (category) => all.filter(([, of]) => of.category === category).map(([code]) => code),
    rare: all.filter(([, { n }]) => n < made.count * 0.008 && n > made.count * 0.001).map(([code]) => code),
  }
}

/** Questions of one shape. */
export function shapedQueries(shape: Shape, made: MadeListings, chance: Chances): () => SearchQuery {
  const buyer = buyers(chance)
  const { speciesOf, rare } = countSpecies(made)
  const nearest = { sort: 'nearest' as SearchSort, limit: PAGE }
  const make: Record<Shape, () => SearchQuery> = {
    A: () => {
      const categoryCode = chance.pick([1, 1, 2, 4])
      const from = buyer()
      return {
        ...from,
        ...nearest,
        categoryCode,
        // Buyers want what is offered most: the square leans towards the first of the list.
        speciesCode: speciesOf(categoryCode)[Math.floor(chance.next() ** 2 * speciesOf(categoryCode).length)],
        radiusKm: chance.pick([50, 100, 200]),
        count: chance.pick([1, 10, 25, 50]),
        mostCents: categoryCode === 1 ? 160 : 1300,
        handover: { pickup: true, lanes: safeLanesTo(from.origin, anyWeek(chance)) },
      }
    },
    B: () => ({ ...buyer(), ...nearest, categoryCode: chance.pick([1, 2, 3, 4]), radiusKm: 500 }),
    C: () => {
      const from = buyer()
      return {
        ...from,
        ...nearest,
        speciesCode: chance.pick(rare.length > 0 ? rare : SPECIES_CODES),
        radiusKm: 500,
        count: 50,
        mostCents: 900,
        handover: { pickup: false, lanes: safeLanesTo(from.origin, anyWeek(chance)) },
      }
    },
    D: () => ({ ...buyer(), ...nearest, radiusKm: 25, handover: { pickup: true, lanes: [] } }),
    E: () => ({
      ...buyer(),
      ...nearest,
      sort: 'cheapest',
      categoryCode: chance.pick([1, 2, 3, 4]),
      radiusKm: 200,
    }),
    F: () => {
      const from = TODAY + chance.between(0, 14)
      const days = { from, until: from + 13 }
      return {
        ...buyer(),
        ...nearest,
        sort: 'soonest',
        categoryCode: chance.pick([1, 2, 4]),
        radiusKm: 200,
        days,
      }
    },
    G: () => ({
      ...buyer(),
      ...nearest,
      sort: 'best-rated',
      categoryCode: chance.pick([1, 2, 4]),
      radiusKm: 4000,
    }),
    H: () => {
      const { handover: _either, ...asked } = make.A()
      return { ...asked, shipped: shippedTo(asked, chance) }
    },
  }
  return make[shape]
}

/** Any mixture of wishes at all, for correctness. */
export function anyQuery(made: MadeListings, chance: Chances): () => SearchQuery {
  const buyer = buyers(chance)
  const { speciesOf } = countSpecies(made)
  const maybe = <T>(share: number, value: () => T): T | undefined => (chance.yes(share) ? value() : undefined)
  return () => {
    const categoryCode = maybe(0.6, () => chance.pick([1, 2, 3, 4]))
    const from = TODAY + chance.between(-2, 30)
    const { origin, buyerState } = buyer()
    return {
      origin,
      radiusKm: chance.pick([1, 25, 80, 160, 160, 500, 1000, 4000]),
      categoryCode,
      speciesCode: maybe(0.4, () =>
        chance.pick(categoryCode && categoryCode !== 3 ? speciesOf(categoryCode) : SPECIES_CODES),
      ),
      sizeMm: maybe(0.2, () => {
        const low = chance.between(5, 60)
        return { from: low, to: low + chance.between(0, 40) }
      }),
      count: maybe(0.5, () => chance.pick([1, 3, 9, 10, 20, 49, 50, 99, 100, 101, 260, 1000, 6000])),
      days: maybe(0.4, () => ({ from, until: from + chance.pick([0, 1, 6, 13, 40, 70, 400]) })),
      mostCents: maybe(0.3, () => chance.pick([50, 100, 180, 900])),
      handover: maybe(0.4, () => ({
        pickup: chance.yes(0.7),
        lanes: chance.yes(0.5) ? safeLanesTo(origin, anyWeek(chance)) : [],
      })),
      shipped: maybe(0.12, () => shippedTo({ origin, buyerState }, chance)),
      buyerState: maybe(0.6, () => buyerState ?? 'OH'),
      sort: chance.pick(['nearest', 'cheapest', 'soonest', 'best-rated'] as const),
      limit: chance.pick([1, 5, 24, 24, 50]),
    }
  }
}
