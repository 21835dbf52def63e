/** A day in the zone of a place: "Sat, Jan 16". `at` is an ISO instant, `zone` an IANA name. */
export function printDay(at: string, zone: string): string {
  return new Intl.DateTimeFormat('en-US', {
    weekday: 'short',
    month: 'short',
    day: 'numeric',
    timeZone: zone,
  }).format(new Date(at))
}

/** The same with the year, for papers and mails: "Saturday, January 16, 2027". */
export function printLongDay(at: string, zone: string): string {
  return new Intl.DateTimeFormat('en-US', { dateStyle: 'full', timeZone: zone }).format(new Date(at))
}

/** A clock time with the zone of the place: "9:00 AM EST". */
export function printClock(at: string, zone: string): string {
  return new Intl.DateTimeFormat('en-US', {
    hour: 'numeric',
    minute: '2-digit',
    timeZone: zone,
    timeZoneName: 'short',
  }).format(new Date(at))
}

function bareClock(at: string, zone: string): string {
  return new Intl.DateTimeFormat('en-US', { hour: 'numeric', minute: '2-digit', timeZone: zone }).format(
    new Date(at),
  )
}

const zoneNameOf = (clock: string) => clock.slice(clock.lastIndexOf(' ') + 1)

/**
 * A pickup window in the time of its place: "Sat, Jan 16, 9:00 AM to 10:00 AM EST". When the clocks change in between,
 * both ends name theirs: "12:30 AM EDT to 2:30 AM EST".
 */
export function printSlot(slot: { startsAt: string; endsAt: string; zone: string }): string {
  const { startsAt, endsAt, zone } = slot
  const [from, until] = [printClock(startsAt, zone), printClock(endsAt, zone)]
  const isSame = zoneNameOf(from) === zoneNameOf(until)
  return `${printDay(startsAt, zone)}, ${isSame ? bareClock(startsAt, zone) : from} to ${until}`
}

/** An instant in words: "Sat, Jan 16, 9:00 AM EST". */
export function printMoment(at: string, zone: string): string {
  return `${printDay(at, zone)}, ${printClock(at, zone)}`
}
