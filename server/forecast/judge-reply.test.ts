import { describe, expect, it } from 'vitest'

import type { ServiceReply } from './ask-service'
import { judgeReply } from './judge-reply'

const DAY_S = 86_400
/** New York's midnight of 2027-11-06, at the offset in force then. */
const FROM_S = Date.parse('2027-11-06T00:00:00-04:00') / 1000

function reply(change: Partial<ServiceReply> = {}): ServiceReply {
  const span = { fromS: FROM_S, untilS: FROM_S + 3 * DAY_S }
  const lists = [
    [1, 2, 3],
    [11, 12, 13],
  ]
  return {
    zone: 'America/New_York',
    offsetS: -4 * 3600,
    daily: { ...span, stepS: DAY_S, lists },
    hourly: { ...span, stepS: 3600, lists: [Array.from({ length: 72 }, (_, at) => at / 10)] },
    ...change,
  }
}

function withDaily(lists: number[][]): ServiceReply {
  const { daily } = reply()
  return reply({ daily: daily && { ...daily, lists } })
}

describe('what the forecast service said', () => {
  it('becomes days by name and hours by instant, also over a change of the clocks', () => {
    const judged = judgeReply(reply())
    expect(judged?.days).toEqual([
      { day: '2027-11-06', minC: 1, maxC: 11 },
      { day: '2027-11-07', minC: 2, maxC: 12 },
      // It begins at 23:00 of the 7th by the wall clock, and is still the 8th.
      { day: '2027-11-08', minC: 3, maxC: 13 },
    ])
    expect(judged?.hours).toHaveLength(72)
    expect(judged?.hours[1]).toEqual({ at: new Date('2027-11-06T05:00:00Z'), airC: 0.1 })
  })

  it.each([
    [
      'a list too short',
      withDaily([
        [1, 2],
        [11, 12, 13],
      ]),
    ],
    [
      'a list too many',
      withDaily([
        [1, 2, 3],
        [11, 12, 13],
        [1, 2, 3],
      ]),
    ],
    ['no lists', withDaily([])],
    [
      'a gap',
      withDaily([
        [1, NaN, 3],
        [11, 12, 13],
      ]),
    ],
    [
      'air that nobody ever measured',
      withDaily([
        [1, 2, 3],
        [11, 60.1, 13],
      ]),
    ],
    [
      'cold that nobody ever measured',
      withDaily([
        [-60.1, 2, 3],
        [11, 12, 13],
      ]),
    ],
    [
      'a low above the high',
      withDaily([
        [1, 12.5, 3],
        [11, 12, 13],
      ]),
    ],
    ['no days', reply({ daily: null })],
    ['no hours', reply({ hourly: null })],
    ['no zone', reply({ zone: '' })],
    ['an offset that no place has', reply({ offsetS: 15 * 3600 })],
    ['days that are not days', reply({ daily: { fromS: 0, untilS: 3, stepS: 1, lists: [[1], [2]] } })],
    ['a span without end', reply({ hourly: { fromS: 0, untilS: Infinity, stepS: 3600, lists: [[1]] } })],
  ])('is refused with %s', (_what, nonsense) => {
    expect(judgeReply(nonsense)).toBeNull()
  })

  it('may lie on the very bounds', () => {
    expect(
      judgeReply(
        withDaily([
          [-60, -60, 60],
          [60, 60, 60],
        ]),
      )?.days[2]?.minC,
    ).toBe(60)
  })
})
