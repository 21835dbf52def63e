import { earthPoint } from '@/shared/domain/geo/earth-point'
import type { CellPoint } from '@/shared/domain/geo/location-cell'
import type { SearchRow, SearchTier } from '@/server/search/search-row'

export const MOST_TIERS = 8

/** Invented listings, one array a fact, so that a million of them can be gone through for every question. */
export class MadeListings {
  readonly count: number
  /** 0 while a listing is not to be found. */
  readonly alive: Uint8Array
  readonly category: Uint8Array
  readonly species: Uint16Array
  readonly seller: Uint32Array
  readonly latE6: Int32Array
  readonly lngE6: Int32Array
  readonly x: Int32Array
  readonly y: Int32Array
  readonly z: Int32Array
  readonly qty: Uint32Array
  readonly minQty: Uint32Array
  readonly tierCount: Uint8Array
  readonly tierFrom: Uint32Array
  readonly tierCents: Uint32Array
  readonly sizeLo: Uint16Array
  readonly sizeHi: Uint16Array
  readonly firstDay: Uint16Array
  /** Bit k: open on firstDay + k, 0 ≤ k < 32. Bit 0 is always set. */
  readonly openAfter: Uint32Array
  readonly pickup: Uint8Array
  readonly lane: Uint16Array
  readonly shipStates: BigUint64Array
  readonly hiddenStates: BigUint64Array
  readonly ratingRank: Uint16Array
  readonly rev: Uint32Array

  constructor(count: number) {
    this.count = count
    this.alive = new Uint8Array(count)
    this.category = new Uint8Array(count)
    this.species = new Uint16Array(count)
    this.seller = new Uint32Array(count)
    this.latE6 = new Int32Array(count)
    this.lngE6 = new Int32Array(count)
    this.x = new Int32Array(count)
    this.y = new Int32Array(count)
    this.z = new Int32Array(count)
    this.qty = new Uint32Array(count)
    this.minQty = new Uint32Array(count)
    this.tierCount = new Uint8Array(count)
    this.tierFrom = new Uint32Array(count * MOST_TIERS)
    this.tierCents = new Uint32Array(count * MOST_TIERS)
    this.sizeLo = new Uint16Array(count)
    this.sizeHi = new Uint16Array(count)
    this.firstDay = new Uint16Array(count)
    this.openAfter = new Uint32Array(count)
    this.pickup = new Uint8Array(count)
    this.lane = new Uint16Array(count)
    this.shipStates = new BigUint64Array(count)
    this.hiddenStates = new BigUint64Array(count)
    this.ratingRank = new Uint16Array(count)
    this.rev = new Uint32Array(count)
  }

  setPlace(at: number, place: CellPoint): void {
    const { x, y, z } = earthPoint(place)
    this.latE6[at] = Math.round(place.lat * 1e6)
    this.lngE6[at] = Math.round(place.lng * 1e6)
    this.x[at] = x
    this.y[at] = y
    this.z[at] = z
  }

  setTiers(at: number, tiers: readonly SearchTier[]): void {
    this.tierCount[at] = tiers.length
    tiers.forEach((tier, index) => {
      this.tierFrom[at * MOST_TIERS + index] = tier.fromCount
      this.tierCents[at * MOST_TIERS + index] = tier.unitCents
    })
  }

  tiers(at: number): SearchTier[] {
    return Array.from({ length: this.tierCount[at] ?? 0 }, (_, index) => ({
      fromCount: this.tierFrom[at * MOST_TIERS + index] ?? 0,
      unitCents: this.tierCents[at * MOST_TIERS + index] ?? 0,
    }))
  }

  /** As the product's writer takes it. Listing numbers begin at 1. */
  row(at: number): SearchRow {
    const first = this.firstDay[at] ?? 0
    const after = this.openAfter[at] ?? 1
    let openDays = 0n
    for (let k = 0; k < 32; k++) if ((after >>> k) & 1) openDays |= 1n << BigInt((first + k) % 64)
    return {
      listingId: at + 1,
      sellerId: this.seller[at] ?? 0,
      categoryCode: this.category[at] ?? 0,
      speciesCode: this.species[at] ?? 0,
      place: { lat: (this.latE6[at] ?? 0) / 1e6, lng: (this.lngE6[at] ?? 0) / 1e6 },
      qty: this.qty[at] ?? 0,
      minQty: this.minQty[at] ?? 0,
      tiers: this.tiers(at),
      sizeLoMm: this.sizeLo[at] ?? 0,
      sizeHiMm: this.sizeHi[at] ?? 0,
      nextDay: first,
      lastDay: first + 31 - Math.clz32(after),
      openDays,
      pickup: this.pickup[at] === 1,
      lane: this.lane[at] ?? 0,
      shipStates: this.shipStates[at] ?? 0n,
      hiddenStates: this.hiddenStates[at] ?? 0n,
      ratingRank: this.ratingRank[at] ?? 0,
      rev: this.rev[at] ?? 0,
    }
  }
}
