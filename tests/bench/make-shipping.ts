import { stateBit } from '@/shared/domain/rules/state-bits'
import { seasonBandAt } from '@/shared/domain/season/season-band'
import type { AnimalClassId, PackingClassId } from '@/shared/domain/season/season-classes.facts'
import { laneOf, NO_LANE } from '@/shared/domain/season/season-lane'
import type { CellPoint } from '@/shared/domain/geo/location-cell'
import { weighted, type Chances } from '@/tests/bench/chances'
import { cities } from '@/tests/bench/cities'
import type { MadeListings } from '@/tests/bench/made-listings'

/** Invented shares: only animals are shipped, and not by every seller; most of those pack in foam for one night. */
const SHIPPED_SHARE = 0.35
const PICKUP_SHARE = 0.85
const EVERYWHERE_SHARE = 0.4
const NEIGHBOURS_KM = 700
const packings: readonly (readonly [PackingClassId, weight: number])[] = [
  ['carton-overnight', 8],
  ['foam-25-overnight', 27],
  ['foam-38-overnight', 35],
  ['carton-two-days', 4],
  ['foam-25-two-days', 11],
  ['foam-38-two-days', 15],
]

/** The invented species fall to the real classes in turn; the first, which are offered most, to the commonest. */
const fish: readonly AnimalClassId[] = [
  'tilapia',
  'sunfish-and-bass',
  'catfish-and-koi',
  'cool-water-fish',
  'perch',
  'trout',
  'redclaw',
  'crawfish',
  'prawn',
]
const worms: readonly AnimalClassId[] = ['worms-and-larvae', 'nightcrawlers']
const FIRST_WORM = 41

/** null: no animal. */
export function animalsOf(category: number, species: number): AnimalClassId | null {
  if (category === 1) return fish[(species - 1) % fish.length] ?? null
  return category === 2 ? (worms[(species - FIRST_WORM) % worms.length] ?? null) : null
}

/** Kilometres, by a flat map: good enough to tell neighbours. */
function apartKm(a: CellPoint, b: CellPoint): number {
  const wide = (a.lng - b.lng) * Math.cos((((a.lat + b.lat) / 2) * Math.PI) / 180)
  return 111.195 * Math.hypot(a.lat - b.lat, wide)
}

const everyState = cities.reduce((mask, { state }) => mask | (stateBit(state) ?? 0n), 0n)

const statesNear = (place: CellPoint): bigint =>
  cities.reduce(
    (mask, city) => (apartKm(place, city.place) < NEIGHBOURS_KM ? mask | (stateBit(city.state) ?? 0n) : mask),
    0n,
  )

// Sellers stand in few cells, and each look goes through hundreds of towns and bands.
const known = new Map<string, { band: number | null; near: bigint }>()

function around(place: CellPoint) {
  const key = `${place.lat} ${place.lng}`
  const before = known.get(key)
  if (before) return before
  const found = { band: seasonBandAt(place.lat, place.lng), near: statesNear(place) }
  known.set(key, found)
  return found
}

/**
 * Whether and how a listing is shipped: by the band of its place, the class of its animals and a packing, as the product
 * writes it. Asks for place, species and hidden states of the listing, so it comes last.
 */
export function makeShipping(made: MadeListings, at: number, chance: Chances): void {
  const { place } = made.row(at)
  const { band, near } = around(place)
  const animals = animalsOf(made.category[at] ?? 0, made.species[at] ?? 0)
  const [packing] =
    packings[
      weighted(
        packings.map(([, weight]) => weight),
        chance,
      )()
    ] ?? []
  const isShipped = chance.yes(SHIPPED_SHARE)
  const isEverywhere = chance.yes(EVERYWHERE_SHARE)
  const isCollected = chance.yes(PICKUP_SHARE)
  const lane =
    isShipped && band !== null && animals && packing ? laneOf({ origin: band, animals, packing }) : NO_LANE
  made.lane[at] = lane
  // What can neither be collected nor shipped is no offer.
  made.pickup[at] = isCollected || lane === NO_LANE ? 1 : 0
  const served = isEverywhere ? everyState : near
  made.shipStates[at] = lane === NO_LANE ? 0n : served & ~(made.hiddenStates[at] ?? 0n)
}
