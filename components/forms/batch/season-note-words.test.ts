import { expect, it } from 'vitest'

import { seasonNote } from './season-note-words'

import type { SeasonVerdict } from '@/shared/domain/season/season-at'

const year = (safe: number, other: SeasonVerdict = 'too-cold'): SeasonVerdict[] => [
  ...Array<SeasonVerdict>(safe).fill('safe-with-packs'),
  ...Array<SeasonVerdict>(52 - safe).fill(other),
]

it('warns of a packing that is never or hardly ever safe', () => {
  expect(seasonNote(year(0))?.title).toBe('With this packing no week of the year is safe')
  expect(seasonNote(year(1))?.title).toBe('With this packing only 1 week of the year is safe')
  expect(seasonNote(year(8))?.title).toBe('With this packing only 8 weeks of the year are safe')
})

it('says nothing of one that does, or where nothing is known', () => {
  expect(seasonNote(year(9))).toBeNull()
  expect(seasonNote(year(0, 'unknown'))).toBeNull()
  expect(seasonNote([])).toBeNull()
})
