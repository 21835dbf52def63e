import { Platform } from 'react-native'

import { createCall } from '@/shared/api/call'

// The web app is served by the API's own origin; the native app is told where it is when it is built.
const base = Platform.OS === 'web' ? '' : (process.env.EXPO_PUBLIC_API_ORIGIN ?? '')

/** The one API client. */
export const call = createCall(base)

/** Where better-auth listens. */
export const authBase = `${base}/api/auth`

/** The pickup of an order as a file for calendar programs. */
export function calendarUrl(orderId: string): string {
  return `${base}/api/v1/orders/${orderId}/calendar.ics`
}

/** The address of an uploaded photo at one of its three widths. */
export function photoUrl(photoId: string, width: 320 | 800 | 1600): string {
  return `${base}/photos/${photoId}-${width}.webp`
}
