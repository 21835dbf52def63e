import { escapeText } from '@/shared/calendar/calendar-text'
import { foldLine } from '@/shared/calendar/fold-line'

export interface CalendarEvent {
  /** The same for as long as the event lives, across moves and its end. */
  uid: string
  /** Rises with every change of the time, and with the end. */
  sequence: number
  /** When this file was made. */
  stampedAt: Date
  startsAt: Date
  endsAt: Date
  isCancelled: boolean
  summary: string
  description: string
  location?: string
  url: string
  /** The address that speaks for the event; RFC 5546 asks for it. */
  organizerEmail: string
}

/** 2027-01-16T14:00:00.000Z as 20270116T140000Z: UTC needs no table of zones and knows no double hour. */
function utc(at: Date): string {
  return `${at.toISOString().slice(0, 19).replace(/[-:]/g, '')}Z`
}

/** One event as an RFC 5545 file: METHOD:PUBLISH, or METHOD:CANCEL once it is off. */
export function writeCalendar(event: CalendarEvent): string {
  const { isCancelled } = event
  const lines = [
    'BEGIN:VCALENDAR',
    'VERSION:2.0',
    'PRODID:-//Tankward//Pickups 1//EN',
    'CALSCALE:GREGORIAN',
    `METHOD:${isCancelled ? 'CANCEL' : 'PUBLISH'}`,
    'BEGIN:VEVENT',
    `UID:${escapeText(event.uid)}`,
    `DTSTAMP:${utc(event.stampedAt)}`,
    `DTSTART:${utc(event.startsAt)}`,
    `DTEND:${utc(event.endsAt)}`,
    `SEQUENCE:${event.sequence}`,
    `STATUS:${isCancelled ? 'CANCELLED' : 'CONFIRMED'}`,
    `ORGANIZER;CN=Tankward:mailto:${event.organizerEmail}`,
    `SUMMARY:${escapeText(event.summary)}`,
    `DESCRIPTION:${escapeText(event.description)}`,
    ...(event.location ? [`LOCATION:${escapeText(event.location)}`] : []),
    `URL:${event.url}`,
    'END:VEVENT',
    'END:VCALENDAR',
  ]
  return lines.map((line) => `${foldLine(line)}\r\n`).join('')
}
