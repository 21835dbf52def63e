/** The hour of the day in the zone of a place, 0 up to 24, minutes as a fraction. `at` is an ISO instant. */
export function hourOfDay(at: string, zone: string): number {
  const parts = new Intl.DateTimeFormat('en-US', {
    hour: 'numeric',
    minute: 'numeric',
    hourCycle: 'h23',
    timeZone: zone,
  }).formatToParts(new Date(at))
  const figure = (type: 'hour' | 'minute') => Number(parts.find((part) => part.type === type)?.value ?? NaN)
  return figure('hour') + figure('minute') / 60
}
