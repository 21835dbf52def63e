import { expect, it } from 'vitest'

import { seasonRuns, seasonSummary, weekWords } from './season-words'

import type { SeasonVerdict } from '@/shared/domain/season/season-at'
import { mondayOfWeek } from '@/shared/times/monday-of-week'

const year: SeasonVerdict[] = [
  ...Array<SeasonVerdict>(12).fill('too-cold'),
  'safe-with-packs',
  ...Array<SeasonVerdict>(39).fill('safe'),
]

it('gathers weeks with one verdict, none left out', () => {
  expect(seasonRuns(year)).toEqual([
    { verdict: 'too-cold', from: 1, to: 12 },
    { verdict: 'safe-with-packs', from: 13, to: 13 },
    { verdict: 'safe', from: 14, to: 52 },
  ])
  expect(seasonRuns([])).toEqual([])
})

it('says the year in words, by the Mondays of ISO weeks', () => {
  expect(weekWords(2027, 1)).toBe('Jan 4')
  expect(
    seasonSummary(
      year,
      year.map((_, at) => mondayOfWeek(2027, at + 1)),
    ),
  ).toBe(
    'Too cold: weeks of Jan 4 to Mar 22. Safe with packs: week of Mar 29. Safe: weeks of Apr 5 to Dec 27.',
  )
})
