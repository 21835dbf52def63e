import type { CalendarEvent } from '@/shared/calendar/write-calendar'

/** A pickup with everything in it that a calendar file of ours may hold. */
export const goodEvent: CalendarEvent = {
  uid: 'pickup-AAAAAAAAAAAAAAAAAAAAAA@tankward',
  sequence: 0,
  stampedAt: new Date('2027-01-10T12:00:00Z'),
  startsAt: new Date('2027-01-16T14:00:00Z'),
  endsAt: new Date('2027-01-16T15:00:00Z'),
  isCancelled: false,
  summary: 'Pick up 25 × Nile tilapia; fingerlings, 2 to 3 inches',
  description: 'Marsh Hatchery, 555-0100\nBring a lidded bucket; half full.\nEverything is paid.',
  location: '12 Mill Lane, Cincinnati, OH 45202',
  url: 'https://tankward.example/orders/AAAAAAAAAAAAAAAAAAAAAA',
  organizerEmail: 'hello@tankward.example',
}
