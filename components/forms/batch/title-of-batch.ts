import type { OwnListing } from '@/shared/contracts/listings'

/** The page's name: a batch nobody has seen is being listed, one with a version is being changed. */
export function titleOfBatch(own: OwnListing): string {
  return own.liveVersion === undefined && own.review === undefined ? 'List a batch' : `Change ${own.title}`
}
