import type { IconName } from '@/components/ui/icon-paths'
import type { NoticeKind, ShownNotice } from '@/shared/contracts/notices'

const icons: Record<NoticeKind, IconName> = {
  request: 'question',
  accepted: 'check',
  scheduled: 'calendar',
  moved: 'calendar',
  ready: 'box',
  'handed-over': 'check',
  dispatched: 'truck',
  arrived: 'box',
  'late-box': 'warn',
  settled: 'money',
  ended: 'stop',
  unclear: 'warn',
  'weather-held': 'warn',
  'quantity-cut': 'warn',
  'no-show': 'warn',
  'evening-before': 'clock',
  'two-hours-before': 'clock',
  'day-seven': 'fish',
  rated: 'star',
  'rating-reply': 'message',
  'listing-approved': 'check',
  'listing-asked': 'question',
  'listing-rejected': 'stop',
  'listing-taken-down': 'stop',
}

export const noticeIcon = (kind: NoticeKind): IconName => icons[kind]

/** Where a notice leads: its order, the listing as everybody sees it, or the listing on the seller's own desk. */
export function noticeHref({ about, kind }: Pick<ShownNotice, 'about' | 'kind'>) {
  if (about.noun === 'order') return `/orders/${about.id}` as const
  // A listing off sale has no form any more: its desk says why.
  if (kind === 'listing-taken-down') return `/sell/listings/${about.id}/manage` as const
  return kind === 'listing-approved'
    ? (`/listings/${about.id}` as const)
    : (`/sell/listings/${about.id}` as const)
}
