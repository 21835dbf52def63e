/** An IANA zone in words: "Eastern Time". */
export function zoneWords(zone: string): string {
  const parts = new Intl.DateTimeFormat('en-US', {
    timeZone: zone,
    timeZoneName: 'longGeneric',
  }).formatToParts()
  return parts.find((part) => part.type === 'timeZoneName')?.value ?? zone
}
