import type { ListingRow } from '@/server/listings/listing-store'
import { Problem } from '@/shared/api/problem'
import type { OwnListing } from '@/shared/contracts/listings'

export type ListingAct = OwnListing['may'][number]
type Standing = Pick<ListingRow, 'state' | 'liveVersion'> & { everSubmitted: boolean }

const abilities: Record<ListingAct, (listing: Standing) => boolean> = {
  edit: ({ state }) => state !== 'taken_down',
  submit: ({ state }) => state !== 'taken_down',
  pause: ({ state }) => state === 'live',
  resume: ({ state, liveVersion }) => state === 'paused' && liveVersion !== null,
  discard: ({ state, everSubmitted }) => state === 'draft' && !everSubmitted,
}

export function listingActs(listing: Standing): ListingAct[] {
  return (Object.keys(abilities) as ListingAct[]).filter((act) => abilities[act](listing))
}

const refusals: Record<ListingAct, string> = {
  edit: 'This listing was taken down: it cannot be changed. Begin a new one.',
  submit: 'This listing was taken down: it cannot be published again. Begin a new one.',
  pause: 'Only a listing that is live can be paused.',
  resume: 'Only a paused listing can be taken up again.',
  discard: 'Only a draft that was never submitted can be thrown away. Pause the listing instead.',
}

export function mayListing(act: ListingAct, listing: Standing): void {
  if (!abilities[act](listing)) {
    throw new Problem('listing-closed', refusals[act], { facts: { state: listing.state } })
  }
}

/** States in which the public sees the page; whether it can be bought is another question. */
export function isPublic(listing: Pick<ListingRow, 'state' | 'liveVersion'>): boolean {
  return listing.liveVersion !== null && ['live', 'paused', 'sold_out', 'expired'].includes(listing.state)
}
