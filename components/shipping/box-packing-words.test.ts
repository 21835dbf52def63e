import { expect, it } from 'vitest'

import { boxPackingLines, packWords, waterWords } from './box-packing-words'

import type { BoxPacking } from '@/shared/contracts/shipments'

const bags: BoxPacking = {
  boxes: 2,
  animalsPerBox: 30,
  bagsPerBox: 3,
  animalsPerBag: 10,
  waterLPerBag: 7.5,
  oxygenLPerBag: 15,
  packs: 'heat',
  packCount: 2,
  packHours: 40,
  startC: 17,
  coldestC: 14,
  warmestC: 18,
  hours: 18,
}

it('says a packing in lines to read at the table', () => {
  expect(boxPackingLines(bags, 'us')).toEqual([
    { label: 'Boxes', text: '2 boxes, up to 30 animals in each' },
    {
      label: 'In each box',
      text: '3 bags, up to 10 animals in each, 2 gal of water and 4 gal of oxygen a bag',
    },
    { label: 'Packs in each box', text: '2 heat packs of 40 hours' },
    { label: 'Water at packing', text: '63 °F (17 °C)' },
    { label: 'On the way', text: 'between 57 °F (14 °C) and 64 °F (18 °C), over 18 hours' },
  ])
})

it('says bedding for what travels without water', () => {
  const bedding: BoxPacking = {
    ...{ boxes: 1, animalsPerBox: 500, beddingKg: 4, packs: 'none', packCount: 0, startC: 18, hours: 36 },
  }
  expect(boxPackingLines(bedding, 'metric')).toEqual([
    { label: 'Boxes', text: '1 box, 500 animals in it' },
    { label: 'In each box', text: '4 kg of bedding' },
    { label: 'Packs in each box', text: 'none' },
    { label: 'Bedding at packing', text: '18 °C (64 °F)' },
  ])
})

it('says one figure where only one is known, and one pack as one', () => {
  expect(waterWords({ coldestC: 14 }, 'us')).toBe('at its coldest 57 °F (14 °C)')
  expect(waterWords({ warmestC: 18 }, 'us')).toBe('at its warmest 64 °F (18 °C)')
  expect(packWords({ ...bags, packs: 'cold', packCount: 1 })).toBe('1 cold pack')
})
