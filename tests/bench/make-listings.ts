import { cellAt, cellCentre, type CellPoint } from '@/shared/domain/geo/location-cell'
import { stateBit } from '@/shared/domain/rules/state-bits'
import { chances, weighted, type Chances } from '@/tests/bench/chances'
import { cities } from '@/tests/bench/cities'
import { MadeListings } from '@/tests/bench/made-listings'
import { makeShipping } from '@/tests/bench/make-shipping'
import { UNRATED_RANK } from '@/server/search/search-row'

/** Invented sizes of the trade: how many listings fall to a category, and how many species share them by Zipf. */
const kinds = [
  { code: 1, weight: 55, firstSpecies: 1, species: 40 },
  { code: 2, weight: 15, firstSpecies: 41, species: 6 },
  { code: 3, weight: 8, firstSpecies: 0, species: 1 },
  { code: 4, weight: 22, firstSpecies: 47, species: 20 },
] as const

export const SPECIES_CODES = Array.from({ length: 66 }, (_, at) => at + 1)
/** The day the questions are asked on, in days since 2020-01-01. */
export const TODAY = 2526

const LISTINGS_A_SELLER = 8
const KM_PER_DEGREE = 111.195

interface Seller {
  place: CellPoint
  ratingRank: number
}

function makeSellers(count: number, chance: Chances): Seller[] {
  const town = weighted(
    cities.map(({ population }) => population * chance.lognormal(0.5)),
    chance,
  )
  return Array.from({ length: count }, () => {
    const { lat, lng } = cities[town()]?.place ?? { lat: 39, lng: -84 }
    const spread = 25 * chance.lognormal(0.6)
    const north = lat + (chance.normal() * spread) / KM_PER_DEGREE
    const east = lng + (chance.normal() * spread) / (KM_PER_DEGREE * Math.cos((lat * Math.PI) / 180))
    const cell = cellAt({ lat: north, lng: east }, 50)
    if (!cell) throw new RangeError(`no cell at ${north}, ${east}`)
    return { place: cellCentre(cell), ratingRank: chance.yes(0.5) ? UNRATED_RANK : chance.between(5, 200) }
  })
}

/** Prices fall at 1 to 8 steps; mostly at the round counts of the trade, now and then at odd ones. */
function makePrices(made: MadeListings, at: number, chance: Chances): void {
  const animals = made.category[at] === 1
  const least = animals ? chance.pick([1, 1, 5, 10, 25, 25, 50, 100]) : 1
  const base = Math.max(20, Math.round((animals ? 110 : 900) * chance.lognormal(0.7)))
  const hundreds = chance.yes(0.7)
    ? [100, 250, 500, 1000, 2500, 5000, 9000]
    : [50, 100, 250, 500, 1000, 2500, 5000]
  const usual = animals ? hundreds : [3, 5, 10, 20, 40, 80, 160]
  const steps = chance.yes(0.02) ? 8 : chance.pick([1, 1, 2, 2, 3, 3, 4])
  const tiers = [{ fromCount: least, unitCents: base }]
  let cents = base
  for (const round of usual) {
    const fromCount = chance.yes(0.1) ? round + chance.between(1, 20) : round
    const before = tiers[tiers.length - 1]?.fromCount ?? 0
    cents = Math.floor(cents * (0.72 + 0.2 * chance.next()))
    if (tiers.length >= steps || cents < 1) break
    if (fromCount > before) tiers.push({ fromCount, unitCents: cents })
  }
  made.setTiers(at, tiers)
  made.minQty[at] = least
  made.qty[at] = Math.max(least, Math.round((animals ? 200 : 25) * chance.lognormal(1.2)))
}

function makeDays(made: MadeListings, at: number, chance: Chances): void {
  made.firstDay[at] = TODAY + Math.floor(-Math.log(1 - chance.next()) * 9)
  // Weekly, twice a week, or any day, for a few weeks.
  const beat = chance.pick([0b1, 0b1001, 0b1111111])
  const weeks = chance.between(1, 4)
  let open = 1
  for (let week = 0; week < weeks; week++) open |= beat << (week * 7)
  made.openAfter[at] = open >>> 0
}

/** Fills in everything about one listing but its seller; also used to change it later. */
export function makeFacts(made: MadeListings, at: number, chance: Chances): void {
  makePrices(made, at, chance)
  makeDays(made, at, chance)
  const sized = made.category[at] === 1
  const shortest = Math.round(15 * chance.lognormal(0.7))
  made.sizeLo[at] = sized ? shortest : 0
  made.sizeHi[at] = sized ? Math.min(60_000, shortest + chance.between(6, 50)) : 65_535
  const barred = chance.yes(0.4) ? [chance.pick(cities).state, chance.pick(cities).state] : []
  made.hiddenStates[at] = barred.reduce((mask, state) => mask | (stateBit(state) ?? 0n), 0n)
  makeShipping(made, at, chance)
}

/** Invented listings of invented sellers around real towns; the same for the same seed. */
export function makeListings(count: number, seed: number): MadeListings {
  const chance = chances(seed)
  const sellers = makeSellers(Math.max(1, Math.round(count / LISTINGS_A_SELLER)), chance)
  const made = new MadeListings(count)
  const kind = weighted(
    kinds.map(({ weight }) => weight),
    chance,
  )
  const zipf = kinds.map(({ species }) =>
    weighted(
      Array.from({ length: species }, (_, rank) => 1 / (rank + 1)),
      chance,
    ),
  )
  for (let at = 0; at < count; at++) {
    const which = kind()
    const { code, firstSpecies } = kinds[which] ?? kinds[0]
    const sellerAt = chance.between(0, sellers.length - 1)
    const seller = sellers[sellerAt]
    if (!seller) throw new RangeError('no such seller')
    made.alive[at] = 1
    made.category[at] = code
    made.species[at] = firstSpecies === 0 ? 0 : firstSpecies + (zipf[which]?.() ?? 0)
    made.seller[at] = sellerAt + 1
    made.ratingRank[at] = seller.ratingRank
    made.rev[at] = 1
    made.setPlace(at, seller.place)
    makeFacts(made, at, chance)
  }
  return made
}
