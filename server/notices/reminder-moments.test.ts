import { describe, expect, it } from 'vitest'

import { quietUntil } from '@/server/notices/quiet-until'
import { isReminderDue, reminderMoment } from '@/server/notices/reminder-moments'
import { wallInstant } from '@/server/notices/wall-instant'

const NEW_YORK = 'America/New_York'
const at = (text: string) => new Date(text)
const pickup = (startsAt: string, zone = NEW_YORK) => ({
  startsAt: at(startsAt),
  zone,
  agreedAt: at('2026-01-01T00:00:00Z'),
})
const moment = (kind: Parameters<typeof reminderMoment>[0], startsAt: string, zone = NEW_YORK) =>
  reminderMoment(kind, pickup(startsAt, zone)).toISOString()

describe('when a pickup is remembered', () => {
  it('is 18:00 of the place on the day before, on both sides of a change of the clocks', () => {
    // 9:00 EST on the day the clocks went back at 2:00: the evening before still had summer time.
    expect(moment('evening-before', '2026-11-01T14:00:00Z')).toBe('2026-10-31T22:00:00.000Z')
    // 9:00 EDT on the day the clocks went forward: the evening before had winter time.
    expect(moment('evening-before', '2027-03-14T13:00:00Z')).toBe('2027-03-13T23:00:00.000Z')
    expect(moment('evening-before', '2027-03-14T16:00:00Z', 'America/Phoenix')).toBe(
      '2027-03-14T01:00:00.000Z',
    )
    expect(moment('evening-before', '2027-03-14T19:00:00Z', 'Pacific/Honolulu')).toBe(
      '2027-03-14T04:00:00.000Z',
    )
  })

  it('is two hours before by the stopwatch, through the hour that comes twice and the one that is missing', () => {
    expect(moment('two-hours-before', '2026-11-01T07:30:00Z')).toBe('2026-11-01T05:30:00.000Z')
    expect(moment('two-hours-before', '2027-03-14T07:30:00Z')).toBe('2027-03-14T05:30:00.000Z')
  })

  it('reads a wall clock that jumps or repeats', () => {
    expect(wallInstant('2027-03-14', '02:30', NEW_YORK).toISOString()).toBe('2027-03-14T07:30:00.000Z')
    expect(wallInstant('2026-11-01', '01:30', NEW_YORK).toISOString()).toBe('2026-11-01T05:30:00.000Z')
  })

  it('is not made up for: neither hours late nor for a day agreed on after it', () => {
    const due = (now: string, agreedAt = '2026-01-01T00:00:00Z') =>
      isReminderDue(
        'evening-before',
        { ...pickup('2027-01-16T14:00:00Z'), agreedAt: at(agreedAt) },
        { at: at(now), quiet: null },
      )
    expect(due('2027-01-15T22:59:00Z')).toBe(false)
    expect(due('2027-01-15T23:00:00Z')).toBe(true)
    expect(due('2027-01-16T03:00:00Z')).toBe(false)
    expect(due('2027-01-15T23:10:00Z', '2027-01-15T23:05:00Z')).toBe(false)
  })
})

describe('quiet hours', () => {
  const night = { from: '22:00', until: '07:00', zone: NEW_YORK }

  it('end on the wall clock of the member, over midnight too', () => {
    expect(quietUntil(at('2027-01-16T02:59:00Z'), night)).toBeNull()
    expect(quietUntil(at('2027-01-16T03:00:00Z'), night)?.toISOString()).toBe('2027-01-16T12:00:00.000Z')
    expect(quietUntil(at('2027-01-16T11:59:00Z'), night)?.toISOString()).toBe('2027-01-16T12:00:00.000Z')
    expect(quietUntil(at('2027-01-16T12:00:00Z'), night)).toBeNull()
    expect(quietUntil(at('2027-03-14T04:00:00Z'), night)?.toISOString()).toBe('2027-03-14T11:00:00.000Z')
    const noon = { from: '12:00', until: '14:00', zone: NEW_YORK }
    expect(quietUntil(at('2027-01-16T18:00:00Z'), noon)?.toISOString()).toBe('2027-01-16T19:00:00.000Z')
    expect(quietUntil(at('2027-01-16T20:00:00Z'), noon)).toBeNull()
  })

  it('hold a reminder back, and the last one only while an hour is left', () => {
    const due = (kind: Parameters<typeof isReminderDue>[0], now: string, until: string) =>
      isReminderDue(kind, pickup('2027-01-16T14:00:00Z'), {
        at: at(now),
        quiet: { from: '17:00', until, zone: NEW_YORK },
      })
    // 18:00 on the day before is quiet; it comes at 20:00.
    expect(due('evening-before', '2027-01-15T23:30:00Z', '20:00')).toBe(false)
    expect(due('evening-before', '2027-01-16T01:00:00Z', '20:00')).toBe(true)
    // 7:00 is quiet until 7:30: an hour and a half is left.
    expect(due('two-hours-before', '2027-01-16T12:00:00Z', '07:30')).toBe(false)
    expect(due('two-hours-before', '2027-01-16T12:30:00Z', '07:30')).toBe(true)
    // Quiet until 8:30 would leave half an hour: it comes on time.
    expect(due('two-hours-before', '2027-01-16T12:00:00Z', '08:30')).toBe(true)
  })
})
