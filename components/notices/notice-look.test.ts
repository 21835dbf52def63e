import { describe, expect, it } from 'vitest'

import { noticeHref } from '@/components/notices/notice-look'
import { unreadBadge } from '@/components/notices/unread-badge'

describe('a notice on the screen', () => {
  it('leads to its order, or to the page of its listing that helps', () => {
    expect(noticeHref({ kind: 'ready', about: { noun: 'order', id: 'o1' } })).toBe('/orders/o1')
    expect(noticeHref({ kind: 'listing-approved', about: { noun: 'listing', id: 'l1' } })).toBe(
      '/listings/l1',
    )
    expect(noticeHref({ kind: 'listing-asked', about: { noun: 'listing', id: 'l1' } })).toBe(
      '/sell/listings/l1',
    )
    expect(noticeHref({ kind: 'listing-taken-down', about: { noun: 'listing', id: 'l1' } })).toBe(
      '/sell/listings/l1/manage',
    )
  })

  it('counts on the bell in at most two digits', () => {
    expect([null, 0, 1, 99, 100].map(unreadBadge)).toEqual(['', '', '1', '99', '99+'])
  })
})
