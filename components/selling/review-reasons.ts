import type { BodyOf } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'

export type ReviewReason = NonNullable<BodyOf<Endpoints['decideReview']>['reason']>

interface ReasonWords {
  /** As the seller reads it. */
  told: string
  /** The field of the batch form where it is put right. */
  field: string
}

export const reviewReasonWords: Record<ReviewReason, ReasonWords> = {
  'species-blocked': {
    told: 'We do not list this species. That is our policy for everyone.',
    field: 'taxonId',
  },
  'species-doubtful': {
    told: 'The species is in doubt. Check the name, or say how you know.',
    field: 'taxonId',
  },
  'photo-not-this-batch': {
    told: 'A photo does not seem to be of this batch.',
    field: 'photos',
  },
  'no-ruler': {
    told: 'No photo shows a ruler beside the fish.',
    field: 'photos',
  },
  'papers-missing': {
    told: 'Licence or health papers are missing.',
    field: 'licenceNumbers',
  },
  'contact-details': {
    told: 'Phone numbers, addresses and links do not belong in a listing: they come with the order.',
    field: 'words',
  },
  'price-unclear': { told: 'The price is not clear.', field: 'tiers' },
  'unsafe-terms': {
    told: 'Some terms would harm buyers or fish.',
    field: 'promise',
  },
  'wild-caught': {
    told: 'Wild-caught animals are not listed here.',
    field: 'wildCaught',
  },
  duplicate: { told: 'This batch is listed already.', field: 'taxonId' },
  other: { told: 'A moderator left a note.', field: 'taxonId' },
}

/** The words of a reason the server named. undefined: a code this version does not know. */
export function wordsOfReason(code: string | undefined): ReasonWords | undefined {
  return code && Object.hasOwn(reviewReasonWords, code) ? reviewReasonWords[code as ReviewReason] : undefined
}
