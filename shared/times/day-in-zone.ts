/** The day in the zone of a place, YYYY-MM-DD. `at` is an ISO instant. */
export function dayInZone(at: string, zone: string): string {
  const parts = new Intl.DateTimeFormat('en-US', {
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
    timeZone: zone,
  }).formatToParts(new Date(at))
  const part = (type: 'year' | 'month' | 'day') => parts.find((one) => one.type === type)?.value ?? ''
  return `${part('year')}-${part('month')}-${part('day')}`
}
