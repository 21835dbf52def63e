import { describe, expect, it } from 'vitest'

import { mayDecide } from '@/server/moderation/review-policy'

const conflict = {
  moderatorId: 'mo',
  sellerMemberId: 'ann',
  category: 'worms',
  ownCategories: [] as string[],
}

describe('who decides on a listing', () => {
  it('is a moderator without a stake in it', () => {
    expect(mayDecide(conflict)).toBe(true)
    expect(mayDecide({ ...conflict, ownCategories: ['produce'] })).toBe(true)
  })

  it('is never the seller', () => expect(mayDecide({ ...conflict, sellerMemberId: 'mo' })).toBe(false))

  it('is never somebody who sells the same kind of thing', () =>
    expect(mayDecide({ ...conflict, ownCategories: ['worms'] })).toBe(false))
})
