import { expect, it } from 'vitest'

import { fishBody } from '@/shared/contracts/fish-batch'
import { badlyTold, issuesOf } from '@/shared/contracts/lot-issues-for-tests'

const terms = {
  countOnHand: 10,
  minOrder: 25,
  orderStep: 5,
  mostPerBuyer: 20,
  tiers: [
    { fromCount: 50, unitCents: 100 },
    { fromCount: 50, unitCents: 100 },
  ],
  windows: [{ day: '2027-01-23', from: '10:00', until: '09:00', capacity: 6 }],
}

it('fish keeps its own words for the terms it shares with worms, media and produce', () => {
  const told = issuesOf(fishBody, { tiers: [{ fromCount: 0, unitCents: 0 }], windows: [], placeKind: '' })
  expect(told).toMatchObject({
    'tiers.0.fromCount': 'From how many?',
    'tiers.0.unitCents': 'A price for each animal.',
    countOnHand: 'How many are there to sell?',
    minOrder: 'The smallest order.',
    orderStep: 'Sold in steps of how many?',
    windows: 'Offer at least one pickup window.',
    placeKind: 'Where do people collect?',
    depositPct: '10 to 50 %.',
  })
})

it("shows what a complaint in a library's own words looks like to the check of the other bodies", () => {
  expect(badlyTold(fishBody, terms).bad).toContain('accept: Invalid option: expected one of "instant"|"ask"')
})
