/** 'Sat, Jan 23, 9:00 AM': how a window is named in a sentence to its seller. */
export function windowWords(startsAt: Date, zone: string): string {
  return new Intl.DateTimeFormat('en-US', {
    weekday: 'short',
    month: 'short',
    day: 'numeric',
    hour: 'numeric',
    minute: '2-digit',
    timeZone: zone,
  }).format(startsAt)
}
