import { readText } from '@/shared/calendar/calendar-text'
import { readLines, type ContentLine } from '@/shared/calendar/read-lines'
import { realTime } from '@/shared/calendar/real-time'

const TEXTS = ['SUMMARY', 'DESCRIPTION', 'LOCATION', 'UID', 'COMMENT', 'PRODID']
const METHODS = ['PUBLISH', 'CANCEL']

/** The lines directly inside each component of a name; nesting that does not close is a fault. */
function componentsOf(lines: ContentLine[], faults: string[]): Map<string, ContentLine[][]> {
  const found = new Map<string, ContentLine[][]>()
  const open: { name: string; own: ContentLine[] }[] = []
  for (const line of lines) {
    if (line.name === 'BEGIN') open.push({ name: line.value, own: [] })
    else if (line.name === 'END') {
      const ended = open.pop()
      if (ended?.name !== line.value) faults.push(`END:${line.value} closes nothing`)
      else found.set(ended.name, [...(found.get(ended.name) ?? []), ended.own])
    } else if (open.length === 0) faults.push(`${line.name} stands outside the calendar`)
    else open.at(-1)?.own.push(line)
  }
  for (const { name } of open) faults.push(`${name} is not closed`)
  return found
}

const named = (lines: ContentLine[], name: string) => lines.filter((line) => line.name === name)

function once(lines: ContentLine[], name: string, where: string): string[] {
  const count = named(lines, name).length
  return count === 1 ? [] : [`${where}: ${name} stands ${count} times, not once`]
}

function textFaults(lines: ContentLine[]): string[] {
  return lines
    .filter((line) => TEXTS.includes(line.name) && readText(line.value) === null)
    .map((line) => `${line.name} is not valid TEXT`)
}

function timeFaults(event: ContentLine[], zones: Set<string>): string[] {
  return event
    .filter((line) => ['DTSTAMP', 'DTSTART', 'DTEND'].includes(line.name))
    .flatMap(({ name, params, value }) => {
      const time = realTime(value)
      if (!time) return [`${name}:${value} is no real time`]
      if (time.isUtc) return params.TZID ? [`${name} is UTC and names a zone`] : []
      if (name === 'DTSTAMP') return ['DTSTAMP is not UTC']
      return params.TZID && zones.has(params.TZID) ? [] : [`${name} is neither UTC nor in a zone of the file`]
    })
}

function eventFaults(event: ContentLine[], method: string | undefined, zones: Set<string>): string[] {
  const valueOf = (name: string) => named(event, name)[0]?.value
  const faults = ['UID', 'DTSTAMP', 'DTSTART', 'SEQUENCE', 'STATUS', 'ORGANIZER', 'SUMMARY'].flatMap((name) =>
    once(event, name, 'VEVENT'),
  )
  faults.push(...textFaults(event), ...timeFaults(event, zones))
  if (valueOf('UID') === '') faults.push('the UID is empty')
  if (!/^\d{1,9}$/.test(valueOf('SEQUENCE') ?? '')) faults.push('SEQUENCE is not a whole number')
  const [start, end] = [realTime(valueOf('DTSTART') ?? ''), realTime(valueOf('DTEND') ?? '')]
  if (start && end && end.ms <= start.ms) faults.push('DTEND is not after DTSTART')
  if ((method === 'CANCEL') !== (valueOf('STATUS') === 'CANCELLED'))
    faults.push('METHOD and STATUS do not agree about the end')
  return faults
}

/** What RFC 5545 finds wrong with a calendar file, looked for in its bytes; empty when nothing is. */
export function calendarFaults(bytes: Uint8Array): string[] {
  const { lines, faults } = readLines(bytes)
  const parts = componentsOf(lines, faults)
  const calendars = parts.get('VCALENDAR') ?? []
  const [calendar] = calendars
  if (!calendar || calendars.length !== 1) return [...faults, `${calendars.length} calendars, not one`]
  faults.push(...['VERSION', 'PRODID', 'METHOD'].flatMap((name) => once(calendar, name, 'VCALENDAR')))
  faults.push(...textFaults(calendar))
  if (named(calendar, 'VERSION')[0]?.value !== '2.0') faults.push('the VERSION is not 2.0')
  const method = named(calendar, 'METHOD')[0]?.value
  if (!METHODS.includes(method ?? '')) faults.push(`METHOD:${method} is not one of ours`)
  const zones = new Set(
    (parts.get('VTIMEZONE') ?? []).flatMap((zone) => named(zone, 'TZID').map((one) => one.value)),
  )
  const events = parts.get('VEVENT') ?? []
  if (events.length === 0) faults.push('there is no event')
  return [...faults, ...events.flatMap((event) => eventFaults(event, method, zones))]
}
