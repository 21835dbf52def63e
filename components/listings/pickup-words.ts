interface Span {
  startsAt: string
  endsAt: string
  zone: string
}

const inZone = (zone: string, parts: Intl.DateTimeFormatOptions) =>
  new Intl.DateTimeFormat('en-US', { timeZone: zone, ...parts })

/** "Sat, Jan 16" in the zone of the place. */
export function pickupDay({ startsAt, zone }: Pick<Span, 'startsAt' | 'zone'>): string {
  return inZone(zone, { weekday: 'short', month: 'short', day: 'numeric' }).format(new Date(startsAt))
}

/** "9:00 – 10:00 AM EST" in the zone of the place. */
export function pickupHours({ startsAt, endsAt, zone }: Span): string {
  const hours = inZone(zone, { hour: 'numeric', minute: '2-digit', timeZoneName: 'short' })
  return hours.formatRange(new Date(startsAt), new Date(endsAt))
}

/** "January 16, 2027" for an ISO day; days of a form have no zone. */
export function plainDay(day: string): string {
  const noon = new Date(`${day}T12:00:00Z`)
  return inZone('UTC', { year: 'numeric', month: 'long', day: 'numeric' }).format(noon)
}
