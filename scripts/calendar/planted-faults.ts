import { goodEvent } from './good-file'

import { writeCalendar } from '@/shared/calendar/write-calendar'

const encoder = new TextEncoder()
const good = writeCalendar(goodEvent)
const long = writeCalendar({ ...goodEvent, summary: '🐟'.repeat(60) })

const without = (name: string) => good.replace(new RegExp(`^${name}[^\\r]*\\r\\n`, 'm'), '')
const instead = (from: string | RegExp, to: string) => good.replace(from, to)

/** The first fold that follows a fish moves two of the fish's four bytes over the line end. */
function foldInsideCharacter(): Uint8Array {
  const bytes = encoder.encode(long)
  const at = bytes.findIndex((byte, i) => byte === 13 && bytes[i + 2] === 32)
  const fold = bytes.slice(at, at + 3)
  return Uint8Array.from([
    ...bytes.slice(0, at - 2),
    ...fold,
    ...bytes.slice(at - 2, at),
    ...bytes.slice(at + 3),
  ])
}

/** Good files spoiled in one way each: a checker that lets one through is broken. */
const spoiled: Record<string, string | Uint8Array> = {
  'bare line feeds': instead(/\r\n/g, '\n'),
  'one bare line feed': instead('VERSION:2.0\r\n', 'VERSION:2.0\n'),
  'a carriage return without its line feed': instead('VERSION:2.0\r\n', 'VERSION:2.0\r'),
  'no line end at the end': good.slice(0, -2),
  'a line of 76 octets': instead('URL:', `X-LONG:${'x'.repeat(69)}\r\nURL:`),
  'a fold inside a character': foldInsideCharacter(),
  'no UID': without('UID'),
  'two UIDs': instead('UID:', 'UID:again\r\nUID:'),
  'no DTSTAMP': without('DTSTAMP'),
  'no DTSTART': without('DTSTART'),
  'no PRODID': without('PRODID'),
  'VERSION twice': instead('VERSION:2.0', 'VERSION:2.0\r\nVERSION:2.0'),
  'month 13': instead('DTSTART:202701', 'DTSTART:202713'),
  'February 30': instead('DTSTART:20270116', 'DTSTART:20270230'),
  'hour 25': instead('DTEND:20270116T15', 'DTEND:20270116T25'),
  'an end before the start': instead('DTEND:20270116T15', 'DTEND:20270116T13'),
  'a floating time': instead('DTSTART:20270116T140000Z', 'DTSTART:20270116T140000'),
  'a zone that the file does not hold': instead('DTSTART:', 'DTSTART;TZID=America/New_York:').replace(
    '20270116T140000Z',
    '20270116T140000',
  ),
  'a bare comma in TEXT': instead('LOCATION:12 Mill Lane\\,', 'LOCATION:12 Mill Lane,'),
  'a bare semicolon in TEXT': instead('tilapia\\;', 'tilapia;'),
  'an unknown escape in TEXT': instead('LOCATION:', 'LOCATION:\\t'),
  'CANCEL with a confirmed event': instead('METHOD:PUBLISH', 'METHOD:CANCEL'),
  'a cancelled event that is published': instead('STATUS:CONFIRMED', 'STATUS:CANCELLED'),
  'a SEQUENCE that is no number': instead('SEQUENCE:0', 'SEQUENCE:first'),
  'an event that is not closed': without('END:VEVENT'),
  'no event': good.replace(/BEGIN:VEVENT[\s\S]*END:VEVENT\r\n/, ''),
}

export const plantedFiles = Object.entries(spoiled).map(([name, file]) => ({
  name,
  bytes: typeof file === 'string' ? encoder.encode(file) : file,
}))

const file = (change: Partial<typeof goodEvent>) => encoder.encode(writeCalendar({ ...goodEvent, ...change }))
const later = { startsAt: new Date('2027-01-17T14:00:00Z'), endsAt: new Date('2027-01-17T15:00:00Z') }

/** Good files in an order that no calendar program could follow. */
export const plantedSeries = [
  { name: 'a move without a new SEQUENCE', files: [file({}), file(later)] },
  { name: 'a SEQUENCE that falls', files: [file({ sequence: 3 }), file({ sequence: 2, ...later })] },
  { name: 'an end without a new SEQUENCE', files: [file({}), file({ isCancelled: true })] },
  { name: 'an event back from its end', files: [file({ isCancelled: true }), file({ sequence: 1 })] },
  { name: 'a new UID', files: [file({}), file({ uid: 'other', sequence: 1 })] },
]
