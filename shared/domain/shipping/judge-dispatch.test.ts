import { describe, expect, it } from 'vitest'

import { judgeDispatch, type DispatchFacts } from '@/shared/domain/shipping/judge-dispatch'
import { judgeShipDay, nearestShipDay, type ShipDay } from '@/shared/domain/shipping/ship-days'

const HOUR_MS = 3_600_000
const nowMs = Date.parse('2027-05-10T14:00:00Z')
const goodFriday = new Map([
  ['2027-03-26', 'A day without carriers'],
  ['2027-05-11', 'Founders day'],
])
const today = (day: string, days: readonly ShipDay[] = ['mon', 'tue', 'wed']) =>
  judgeShipDay(day, { days, nights: 1, noShipDays: goodFriday })

/** A Monday on which nothing is wrong. */
const good: DispatchFacts = {
  isReady: true,
  isBalanceCaptured: true,
  papersNeeded: ['Health paper'],
  papers: [{ kind: 'Health paper', expiresOn: '2027-05-18' }],
  shipDay: '2027-05-17',
  arriveDay: '2027-05-18',
  today: today('2027-05-17'),
  check: { verdict: 'safe', atMs: nowMs - 12 * HOUR_MS, isPackingKnown: true, reasons: [] },
  nowMs,
  ticksNeeded: ['strong-carton', 'carrier-told'],
  ticks: ['carrier-told', 'strong-carton'],
}

const codesOf = (change: Partial<DispatchFacts>) =>
  judgeDispatch({ ...good, ...change }).map(({ code, pointer }) => `${code} ${pointer}`)

const papers = (expiresOn: string, kind = 'Health paper') => [{ kind, expiresOn }]
const check = (verdict: 'safe' | 'unsafe' | 'unknown', hours: number) => ({
  isPackingKnown: true,
  verdict,
  atMs: nowMs - hours * HOUR_MS,
  reasons: ['The water would begin to freeze.'],
})

const table: [string, Partial<DispatchFacts>, string[]][] = [
  ['nothing is wrong', {}, []],
  [
    'nobody knows how to pack',
    { check: { ...check('safe', 1), isPackingKnown: false } },
    ['packing-open #/check'],
  ],
  ['the animals are not ready', { isReady: false }, ['not-ready #/state']],
  ['the balance is not paid', { isBalanceCaptured: false }, ['balance-unpaid #/balance']],
  ['a paper is not named', { papers: [] }, ['paper-missing #/papers']],
  ['another paper is named', { papers: papers('2028-01-01', 'Import permit') }, ['paper-missing #/papers']],
  ['the paper is good until the day before', { papers: papers('2027-05-17') }, ['paper-expired #/papers']],
  [
    'a paper nobody asked for has expired',
    { papersNeeded: [], papers: papers('2027-05-01') },
    ['paper-expired #/papers'],
  ],
  ['the old paper was renewed', { papers: [...papers('2027-05-01'), ...papers('2027-09-01')] }, []],
  ['nobody looked at the way', { check: null }, ['check-missing #/check']],
  ['the look is a minute too old', { check: check('safe', 12 + 1 / 60) }, ['check-old #/check']],
  ['the way is not safe', { check: check('unsafe', 1) }, ['check-not-safe #/check']],
  ['nobody can say', { check: check('unknown', 1) }, ['check-not-safe #/check']],
  ['it is the day before', { shipDay: '2027-05-18', arriveDay: '2027-05-18' }, ['day-not-agreed #/shipDay']],
  ['a tick is missing', { ticks: ['carrier-told'] }, ['tick-missing #/ticks/strong-carton']],
  [
    'it is a holiday where it arrives',
    { shipDay: '2027-05-10', today: today('2027-05-10') },
    ['day-not-lawful #/shipDay'],
  ],
  ['it is a holiday', { shipDay: '2027-05-11', today: today('2027-05-11') }, ['day-not-lawful #/shipDay']],
  [
    'it is the Thursday before a Friday without carriers',
    { shipDay: '2027-03-25', today: today('2027-03-25') },
    ['day-not-lawful #/shipDay', 'day-not-lawful #/shipDay'],
  ],
]

describe('the dispatch gate', () => {
  it.each(table)('when %s', (_, change, expected) => {
    expect(codesOf(change)).toEqual(expected)
  })

  it('tells all reasons at once, each in its own sentence', () => {
    const faults = judgeDispatch({
      ...good,
      isReady: false,
      isBalanceCaptured: false,
      papers: [],
      check: check('unsafe', 30),
      today: today('2027-03-25'),
      ticks: [],
    })
    expect(faults.map(({ pointer }) => pointer)).toEqual([
      ...['#/state', '#/balance', '#/papers', '#/check', '#/check'],
      ...['#/shipDay', '#/shipDay', '#/shipDay'],
      ...['#/ticks/strong-carton', '#/ticks/carrier-told'],
    ])
    const said = faults.map(({ detail }) => detail).join(' ')
    for (const words of [
      'Health paper',
      'freeze',
      '30 hours old',
      'A day without carriers',
      'Mon, May 17',
      'Thu, Mar 25',
    ])
      expect(said).toContain(words)
  })

  it('finds the Monday after a Thursday before a Friday without carriers', () => {
    const rule = { days: ['mon', 'tue', 'wed'] as const, nights: 1, noShipDays: goodFriday }
    expect(nearestShipDay('2027-03-25', rule)?.shipDay).toBe('2027-03-29')
  })
})
