import { describe, expect, it } from 'vitest'

import { presentShippedThroughYear } from '@/server/listings/present-shipped'
import { seasonWeek } from '@/server/listings/season-week'
import { safeLanesTo } from '@/server/search/safe-lanes-to'
import { searchRowOf } from '@/server/search/search-row-of'
import { batchBody } from '@/seed/batch-body'
import { findState } from '@/shared/domain/rules/find-state'
import { stateBit } from '@/shared/domain/rules/state-bits'
import { buyerCellAt, cellAt, cellCentre } from '@/shared/domain/geo/location-cell'
import { taxa } from '@/shared/domain/species/taxa.facts'
import { animalClassOf, packingClassIds } from '@/shared/domain/season/season-lane'
import { chances } from '@/tests/bench/chances'
import { cities } from '@/tests/bench/cities'
import { disagreements, readStrip, type Told } from '@/tests/support/season-tellers'

const TRIPLES = 5_000
const shipped = taxa.filter(({ speciesId }) => speciesId && animalClassOf(speciesId))
const served = cities.filter(({ state }) => findState(state)?.takesAnimals)

/** Random listings, places and weeks, each asked of filter, badge and strip; `lanesFor` is what the filter goes by. */
function askAll(lanesFor: typeof safeLanesTo, triples = TRIPLES): Told[] {
  const chance = chances(1904)
  const near = ({ place }: (typeof cities)[number]) => ({
    lat: place.lat + chance.normal() * 0.3,
    lng: place.lng + chance.normal() * 0.3,
  })
  return Array.from({ length: triples }, (_, at) => {
    const seller = chance.pick(served)
    // Half of them near by, where more of the year is safe.
    const buyer = chance.yes(0.5) ? seller : chance.pick(served)
    const [sellerCell, buyerCell] = [cellAt(near(seller), 50), buyerCellAt(near(buyer))]
    const taxon = chance.pick(shipped)
    if (!sellerCell || !buyerCell) throw new RangeError('not on Earth')
    const from = cellCentre(sellerCell)
    const states = chance.yes(0.8) ? [seller.state, buyer.state] : [seller.state]
    // The thick box is the one that is often safe.
    const packing = chance.yes(0.6) ? 'foam-38-overnight' : chance.pick(packingClassIds)
    const body = batchBody(new Date('2027-01-15T12:00:00Z'), {
      taxonId: taxon.id,
      statesServed: [...new Set(states)],
      shipping: {
        packing,
        boxCents: 1200,
        freightCents: 4800,
        carrier: 'Overnight air',
        carrierAccepts: true,
        holdsAtCounter: true,
        mostInBox: 100,
        days: ['mon'],
      },
    })
    const day = new Date(Date.UTC(2026, 0, 1) + chance.between(0, 1500) * 86_400_000)
    const when = seasonWeek(day, chance.yes(0.2) ? undefined : chance.between(1, 53))
    const hiddenStates = chance.yes(0.1) ? (stateBit(buyer.state) ?? 0n) : 0n
    const row = searchRowOf(
      {
        ...{ listingId: 1, sellerId: 1, free: 500, body, state: seller.state },
        ...{ cellLat: from.lat, cellLng: from.lng, ratingCount: 0, ratingSum: 0 },
      },
      { windows: [{ listingId: 1, startsAt: day, zone: 'UTC' }], hiddenStates, rev: 1 },
    )
    const to = { centre: cellCentre(buyerCell), state: buyer.state }
    const status = hiddenStates ? 'prohibited' : 'allowed'
    const year = presentShippedThroughYear({ body, from, to, status, when })
    if (!row || !year) throw new Error(`${taxon.id} is not shipped`)
    return {
      name: `${at} ${taxon.id} ${packing} ${seller.name} to ${buyer.name} in week ${when.week}`,
      // As the search text tests it.
      isFound:
        (row.shipStates & (stateBit(buyer.state) ?? 0n)) !== 0n &&
        lanesFor(to.centre, when.week).includes(row.lane),
      isServed: year.isServed,
      badge: year,
      strip: readStrip(year),
    }
  })
}

describe('filter, badge and strip of the shipping season', () => {
  it(`never disagree on ${TRIPLES} random listings, places and weeks`, () => {
    const told = askAll(safeLanesTo)
    expect(disagreements(told)).toEqual([])
    // The draw must have been worth asking: every verdict, both answers of the filter, unserved states.
    const verdicts = new Set(told.map(({ badge }) => badge.verdict))
    expect([...verdicts].sort()).toEqual(expect.arrayContaining(['safe-with-packs', 'too-cold', 'too-hot']))
    expect(told.filter(({ isFound }) => isFound).length).toBeGreaterThan(200)
    expect(told.filter(({ isServed }) => !isServed).length).toBeGreaterThan(200)
  })

  it('would be caught: a filter that goes by the next week', () => {
    const late: typeof safeLanesTo = (place, week) => safeLanesTo(place, (week % 52) + 1)
    expect(disagreements(askAll(late, 1_500)).length).toBeGreaterThan(10)
  })

  it('would be caught: a filter that takes a place half a degree off', () => {
    const off: typeof safeLanesTo = ({ lat, lng }, week) => safeLanesTo({ lat: lat - 0.5, lng }, week)
    expect(disagreements(askAll(off, 1_500)).length).toBeGreaterThan(10)
  })

  it('would be caught: a badge of another week than the strip, or with another next week', () => {
    const [one] = askAll(safeLanesTo, 1)
    const late = { ...one?.strip, verdict: one?.strip.verdict ?? '', nextMonday: '2001-01-01' }
    expect(one && disagreements([{ ...one, strip: late }])).toHaveLength(1)
    expect(one && disagreements([{ ...one, strip: { verdict: 'planted' } }])).toHaveLength(1)
  })
})
