import type { TagBadge } from '@/components/listings/tag-facts'
import type { OwnListing } from '@/shared/contracts/listings'

const states: Record<OwnListing['state'], TagBadge> = {
  draft: { word: 'Draft', tone: 'neutral', icon: 'edit' },
  pending_review: { word: 'Waiting for a moderator', tone: 'info', icon: 'clock' },
  live: { word: 'Live', tone: 'safe', icon: 'check' },
  paused: { word: 'Paused', tone: 'neutral', icon: 'minus' },
  sold_out: { word: 'Sold out', tone: 'neutral', icon: 'check' },
  expired: { word: 'Over: no pickup window left', tone: 'caution', icon: 'calendar' },
  taken_down: { word: 'Taken down', tone: 'danger', icon: 'stop' },
}

/** Where a seller's listing stands, in words: its state, and what a moderator said of the newest version. */
export function ownBadges({ state, review }: OwnListing): TagBadge[] {
  if (review?.state === 'asked') return [{ word: 'A moderator asks', tone: 'caution', icon: 'question' }]
  if (review?.state === 'rejected')
    return [{ word: 'Not approved', tone: 'danger', icon: 'stop' }, ...still(state)]
  const waits = review?.state === 'waiting' && state !== 'pending_review'
  return [states[state], ...(waits ? [{ word: 'A change waits', tone: 'info', icon: 'clock' } as const] : [])]
}

/** A refused change leaves the approved version where it was. */
const still = (state: OwnListing['state']) => (state === 'live' || state === 'paused' ? [states[state]] : [])

/** Whether the seller has to answer a moderator. */
export function isAnswerDue({ review, state }: OwnListing): boolean {
  return state !== 'taken_down' && (review?.state === 'asked' || review?.state === 'rejected')
}
