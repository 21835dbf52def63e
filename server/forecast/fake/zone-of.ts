import findZone from '@photostructure/tz-lookup'

import type { Place } from './weather'

export function zoneAt({ lat, lng }: Place): string {
  return findZone(lat, lng)
}

/**
 * Seconds east of UTC; null for a zone nobody knows. The real service answers with one offset for all its days, the
 * one in force at the moment of asking (its maintainer in github.com/open-meteo/open-meteo, issue 261; 1545 and 1764
 * show it), so days after a change of the clocks begin at 1:00 or 23:00 by the wall clock. We do the same.
 */
export function offsetOf(zone: string, now: Date): number | null {
  try {
    const parts = new Intl.DateTimeFormat('en-US', { timeZone: zone, timeZoneName: 'longOffset' })
    const name = parts.formatToParts(now).find((part) => part.type === 'timeZoneName')?.value ?? ''
    const [, sign, hours, minutes] = /^GMT(?:([+-])(\d\d):(\d\d))?$/.exec(name) ?? []
    const seconds = Number(hours ?? 0) * 3600 + Number(minutes ?? 0) * 60
    return sign === '-' ? -seconds : seconds
  } catch {
    return null
  }
}
