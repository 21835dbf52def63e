import { describe, expect, it } from 'vitest'

import { calendarFaults } from '@/shared/calendar/calendar-faults'
import { escapeText, readText } from '@/shared/calendar/calendar-text'
import { foldLine } from '@/shared/calendar/fold-line'
import { writeCalendar, type CalendarEvent } from '@/shared/calendar/write-calendar'

const bytesOf = (text: string) => new TextEncoder().encode(text)

const event: CalendarEvent = {
  uid: 'pickup-1@tankward',
  sequence: 2,
  stampedAt: new Date('2026-10-20T08:00:00.123Z'),
  // The second 1:30 of the night the clocks go back in New York: 06:30 UTC, where the first is 05:30.
  startsAt: new Date('2026-11-01T06:30:00Z'),
  endsAt: new Date('2026-11-01T07:30:00Z'),
  isCancelled: false,
  summary: 'Pick up 25 × tilapia; small, lively',
  description: 'One\r\nTwo\\three',
  location: '12 Mill Lane, Cincinnati',
  url: 'https://tankward.example/orders/1',
  organizerEmail: 'hello@tankward.example',
}

describe('a calendar file', () => {
  it('is these bytes', () => {
    expect(writeCalendar(event)).toBe(
      [
        'BEGIN:VCALENDAR',
        'VERSION:2.0',
        'PRODID:-//Tankward//Pickups 1//EN',
        'CALSCALE:GREGORIAN',
        'METHOD:PUBLISH',
        'BEGIN:VEVENT',
        'UID:pickup-1@tankward',
        'DTSTAMP:20261020T080000Z',
        'DTSTART:20261101T063000Z',
        'DTEND:20261101T073000Z',
        'SEQUENCE:2',
        'STATUS:CONFIRMED',
        'ORGANIZER;CN=Tankward:mailto:hello@tankward.example',
        'SUMMARY:Pick up 25 × tilapia\\; small\\, lively',
        'DESCRIPTION:One\\nTwo\\\\three',
        'LOCATION:12 Mill Lane\\, Cincinnati',
        'URL:https://tankward.example/orders/1',
        'END:VEVENT',
        'END:VCALENDAR',
        '',
      ].join('\r\n'),
    )
  })

  it('says that it is off', () => {
    const text = writeCalendar({ ...event, isCancelled: true, location: undefined })
    expect(text).toContain('\r\nMETHOD:CANCEL\r\n')
    expect(text).toContain('\r\nSTATUS:CANCELLED\r\n')
    expect(text).not.toContain('LOCATION')
    expect(calendarFaults(bytesOf(text))).toEqual([])
  })

  it('folds at 75 octets and never inside a character', () => {
    const folded = foldLine(`SUMMARY:${'🐟'.repeat(40)}`)
    const lines = folded.split('\r\n')
    expect(lines.length).toBeGreaterThan(2)
    for (const line of lines) expect(bytesOf(line).length).toBeLessThanOrEqual(75)
    expect(lines.slice(1).every((line) => line.startsWith(' '))).toBe(true)
    expect(folded).not.toContain('\ufffd')
    expect(folded.replaceAll('\r\n ', '')).toBe(`SUMMARY:${'🐟'.repeat(40)}`)
    expect(foldLine('x'.repeat(75))).not.toContain('\r\n')
    expect(
      foldLine('x'.repeat(76))
        .split('\r\n')
        .map((line) => line.length),
    ).toEqual([75, 2])
  })

  it('lets nobody write a line of their own into it', () => {
    const summary = 'x\r\nEND:VEVENT\r\nBEGIN:VEVENT\nATTENDEE:mailto:a@b.example'
    const text = writeCalendar({ ...event, summary })
    expect(text.match(/^END:VEVENT/gm)).toHaveLength(1)
    expect(text).not.toMatch(/^ATTENDEE/m)
    expect(calendarFaults(bytesOf(text))).toEqual([])
  })

  it('gives every text back as it was', () => {
    for (const text of ['a,b;c\\d', 'one\ntwo', '\\n is no line break', '👩🏽‍🌾, 鱼'])
      expect(readText(escapeText(text))).toBe(text)
    expect(escapeText('a\u0000b\u2028c\rd')).toBe('ab\\nc\\nd')
    expect(readText('a\\x')).toBeNull()
    expect(readText('a,b')).toBeNull()
  })
})
