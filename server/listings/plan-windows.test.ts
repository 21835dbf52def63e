import { describe, expect, it } from 'vitest'

import { planWindows } from '@/server/listings/plan-windows'
import { resolveWindows } from '@/server/listings/resolve-windows'
import type { WindowRow } from '@/server/listings/window-store'

const at = new Date('2027-01-20T12:00:00Z')
const zone = 'America/New_York'
const nine = {
  startsAt: new Date('2027-01-23T14:00:00Z'),
  endsAt: new Date('2027-01-23T15:00:00Z'),
  capacity: 6,
}
const ten = {
  startsAt: new Date('2027-01-23T15:00:00Z'),
  endsAt: new Date('2027-01-23T16:00:00Z'),
  capacity: 6,
}
const past = {
  startsAt: new Date('2027-01-16T14:00:00Z'),
  endsAt: new Date('2027-01-16T15:00:00Z'),
  capacity: 6,
}

const row = (id: number, window: typeof nine, change: Partial<WindowRow> = {}): WindowRow => ({
  ...{ id, publicId: `w${id}`, listingId: 1, ...window, zone, taken: 0, placeKind: 'farm-gate', closed: 0 },
  ...change,
})

describe('changing the pickup windows of a listing', () => {
  it('adds new ones, keeps known ones and closes what nobody holds', () => {
    expect(planWindows([row(1, nine)], [ten], at)).toEqual({
      add: [ten],
      change: [],
      close: [1],
      problems: [],
    })
    expect(planWindows([row(1, nine)], [nine, ten], at)).toEqual({
      ...{ add: [ten], change: [{ id: 1, capacity: 6 }], close: [], problems: [] },
    })
  })

  it('lets no window vanish in which somebody holds a place, and names it', () => {
    const plan = planWindows([row(1, nine, { taken: 1 })], [ten], at)
    expect(plan.close).toEqual([])
    expect(plan.problems).toEqual([
      '1 buyer has a place in Sat, Jan 23, 9:00 AM: it cannot be moved or taken away.',
    ])
  })

  it('lets no window shrink below its buyers', () => {
    const plan = planWindows([row(1, nine, { taken: 4 })], [{ ...nine, capacity: 3 }], at)
    expect(plan.problems).toEqual(['4 buyers have a place in Sat, Jan 23, 9:00 AM: it cannot hold fewer.'])
    expect(plan.change).toEqual([{ id: 1, capacity: 4 }])
  })

  it('leaves what is over alone, and refuses to offer it anew', () => {
    expect(planWindows([row(1, past, { taken: 2 })], [nine], at).problems).toEqual([])
    expect(planWindows([row(1, past)], [past, nine], at)).toMatchObject({ add: [nine], problems: [] })
    expect(planWindows([], [past], at).problems).toHaveLength(1)
  })
})

describe('typed windows', () => {
  const typed = (day: string, from: string, until: string) => ({ day, from, until, capacity: 3 })
  const faults = (...windows: ReturnType<typeof typed>[]) =>
    resolveWindows(windows, { zone, at }).errors.map(({ pointer, detail }) => [pointer, detail])

  it('stand in the zone of the farm', () => {
    const { windows, errors } = resolveWindows([typed('2027-01-23', '09:00', '10:00')], { zone, at })
    expect(errors).toEqual([])
    expect(windows).toEqual([{ ...nine, capacity: 3 }])
  })

  it('are refused where the clocks change over them', () => {
    expect(faults(typed('2027-03-14', '02:15', '03:15'))).toEqual([
      ['#/draft/windows/0/from', 'The clocks jump over that time on that day. Choose another.'],
    ])
  })

  it('are refused twice, or too far ahead', () => {
    const nineToTen = typed('2027-01-23', '09:00', '10:00')
    expect(faults(nineToTen, nineToTen)).toEqual([['#/draft/windows/1/from', 'That window is there twice.']])
    expect(faults(typed('2027-12-01', '09:00', '10:00'))).toEqual([
      ['#/draft/windows/0/day', 'At most half a year ahead.'],
    ])
  })
})
