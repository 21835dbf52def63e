import { expect, it } from 'vitest'

import { countedNoun, countedWords } from './counted-words'

import type { SupplyBody } from '@/components/supplies/supply-body'
import { clay, redWigglers } from '@/shared/domain/listings/lots-for-tests'
import type { FishBody } from '@/shared/contracts/fish-batch'

const lettuce = { category: 'produce', saleUnit: { kind: 'head' } }
const larvae = { ...redWigglers, taxonId: 'black_soldier_fly_larvae' }

it.each([
  { body: { category: 'fish' }, count: 60, words: '60', noun: '' },
  { body: lettuce, count: 3, words: '3 heads', noun: 'heads' },
  { body: lettuce, count: 1, words: '1 head', noun: 'head' },
  { body: redWigglers, count: 2, words: '2 packs of 500 worms', noun: 'packs' },
  { body: larvae, count: 1, words: '1 pack of 500 larvae', noun: 'pack' },
  { body: clay, count: 2, words: '2 bags of 50 L (1.8 cu ft)', noun: 'bags' },
])('counts in the words of the unit: $words', ({ body, count, words, noun }) => {
  const lot = body as unknown as FishBody | SupplyBody
  expect(countedWords(lot, count)).toBe(words)
  expect(countedNoun(lot, count)).toBe(noun)
})
