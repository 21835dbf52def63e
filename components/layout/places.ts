import type { IconName } from '@/components/ui/icon-paths'
import type { Href } from 'expo-router'

interface Place {
  label: string
  href: Href
  icon: IconName
}

// The places of the bar and the rail, in reading order: a new place is one line here and one screen.
export const places: readonly Place[] = [
  { label: 'Find', href: '/', icon: 'find' },
  { label: 'Orders', href: '/orders', icon: 'orders' },
  { label: 'Sell', href: '/sell', icon: 'sell' },
  { label: 'Me', href: '/me', icon: 'me' },
]

/** Whether a path lies in a place: '/orders/7' is in Orders, only '/' itself is in Find. */
export function isInPlace(pathname: string, href: Href): boolean {
  const start = String(href)
  return start === '/' ? pathname === '/' : pathname === start || pathname.startsWith(`${start}/`)
}
