const msPerDay = 86_400_000

/** The calendar day it is now in a zone: "2027-01-15". */
export function todayIn(zone: string): string {
  return new Intl.DateTimeFormat('en-CA', { timeZone: zone }).format(new Date())
}

/** A calendar day some days later; '' stays ''. */
export function addDays(day: string, count: number): string {
  const at = Date.parse(`${day}T00:00:00Z`)
  return Number.isNaN(at) ? '' : new Date(at + count * msPerDay).toISOString().slice(0, 10)
}

/** The first Saturday after a day: when most people collect. */
export function nextSaturday(day: string): string {
  const weekday = new Date(`${day}T00:00:00Z`).getUTCDay()
  return addDays(day, weekday === 6 ? 7 : 6 - weekday)
}

/** "Sat, Jan 23". */
export function printDay(day: string): string {
  const at = new Date(`${day}T00:00:00Z`)
  if (Number.isNaN(at.getTime())) return ''
  return at.toLocaleDateString('en-US', { weekday: 'short', month: 'short', day: 'numeric', timeZone: 'UTC' })
}

/** "9:00 AM" from "09:00". */
export function printTime(time: string): string {
  const at = new Date(`2026-01-01T${time}:00Z`)
  if (Number.isNaN(at.getTime())) return ''
  return at.toLocaleTimeString('en-US', { hour: 'numeric', minute: '2-digit', timeZone: 'UTC' })
}

/** "12:04" on the clock of whoever looks. */
export function printClock(instant: string): string {
  return new Date(instant).toLocaleTimeString('en-US', { hour: 'numeric', minute: '2-digit' })
}
