import { printDate } from '@/shared/domain/calendar/print-date'
import type { ShipDayFault } from '@/shared/domain/shipping/ship-days'

/** Why a day is no lawful ship day, in a sentence. */
export function faultWords({ code, day: date, why }: ShipDayFault): string {
  const day = printDate(date)
  switch (code) {
    case 'not-a-ship-day':
      return `${day} is not one of the days on which the seller ships; no box waits over a weekend.`
    case 'holiday':
      return `On ${day} carriers do not work: ${why ?? 'a holiday'}.`
    case 'holiday-on-the-way':
      return `The box would be on its way on ${day}, when carriers do not work: ${why ?? 'a holiday'}.`
    case 'arrives-on-holiday':
      return `The box would arrive on ${day}, when carriers do not deliver: ${why ?? 'a holiday'}.`
    case 'arrives-on-sunday':
      return `The box would arrive on ${day}, when carriers do not deliver.`
  }
}
