import { Problem } from '@/shared/api/problem'

interface Conflict {
  moderatorId: string
  sellerMemberId: string
  category: string
  /** What the moderator sells. */
  ownCategories: string[]
}

/** Nobody decides on their own listing, nor on one that competes with theirs. */
export function mayDecide({ moderatorId, sellerMemberId, category, ownCategories }: Conflict): boolean {
  return moderatorId !== sellerMemberId && !ownCategories.includes(category)
}

export function requireImpartial(conflict: Conflict): void {
  if (mayDecide(conflict)) return
  throw new Problem(
    'not-allowed',
    conflict.moderatorId === conflict.sellerMemberId
      ? 'This is your own listing: another moderator decides on it.'
      : `You sell ${conflict.category} yourself: another moderator decides on this listing.`,
  )
}
