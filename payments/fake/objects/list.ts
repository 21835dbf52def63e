import type Stripe from 'stripe'

export function presentList<T>(url: string, data: T[], hasMore = false): Stripe.ApiList<T> {
  return { object: 'list', url, has_more: hasMore, data }
}
