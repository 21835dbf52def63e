import type { Marks } from '@/shared/contracts/ratings'

interface DemoRating {
  marks: Marks
  words: string
  reply?: string
}

/** What buyers of the demo say, good and bad. */
export const demoRatings: readonly DemoRating[] = [
  {
    marks: { fish: 5, count: 5, contact: 5 },
    words: 'Lively, all the same size, and two extra in the pail.',
  },
  { marks: { fish: 5, count: 5, contact: 4 }, words: 'Eating on the first evening. Easy to find the gate.' },
  { marks: { fish: 4, count: 5, contact: 5 }, words: 'Good fish. A little smaller than I had hoped for.' },
  { marks: { fish: 4, count: 4, contact: 4 }, words: '' },
  {
    marks: { fish: 5, count: 5, contact: 5 },
    words: 'Counted together, took his time to show me the tanks.',
    reply: 'Thank you. Come again in spring, the next hatch is bigger.',
  },
  {
    marks: { fish: 3, count: 4, contact: 2 },
    words: 'Fish are fine, but I waited forty minutes and got no answer.',
    reply: 'You are right, a pump needed me that morning. I am sorry for the wait.',
  },
  {
    marks: { fish: 2, count: 5, contact: 4 },
    words: 'Some had torn fins and I lost a few on the second day.',
  },
]
