/**
 * RFC 9457 problem details: one shape for every answer that is not a success.
 * The list is closed, so a screen can switch on the slug; `title` is the default sentence.
 */
export const problems = {
  'fields-invalid': { status: 422, title: 'Some fields need another look' },
  'body-unreadable': { status: 400, title: 'The request could not be read' },
  'cursor-unreadable': { status: 400, title: 'That page link has expired' },
  'key-missing': { status: 400, title: 'The request carried no idempotency key' },
  'key-reused': { status: 422, title: 'That idempotency key was used for something else' },
  'key-running': { status: 409, title: 'The same request is still running' },
  'not-signed-in': { status: 401, title: 'Please sign in' },
  'not-allowed': { status: 403, title: 'Your account may not do this' },
  'second-factor-needed': { status: 403, title: 'A second factor is needed first' },
  'email-unverified': { status: 403, title: 'Please confirm your e-mail address first' },
  'forged-request': { status: 403, title: 'The request did not come from this site' },
  'not-found': { status: 404, title: 'Nothing here' },
  'no-such-path': { status: 404, title: 'No such address' },
  'method-unknown': { status: 405, title: 'That method does not exist here' },
  'too-large': { status: 413, title: 'That is too large' },
  'wrong-kind': { status: 415, title: 'That kind of file or body is not accepted' },
  'too-often': { status: 429, title: 'Too often in a short time' },
  'batch-short': { status: 409, title: 'Just taken: not enough left' },
  'slot-full': { status: 409, title: 'That pickup window is full' },
  'listing-closed': { status: 409, title: 'This listing is not open' },
  'own-batch': { status: 409, title: 'This is your own listing' },
  'below-minimum': { status: 409, title: 'Below the smallest order' },
  'species-prohibited': { status: 409, title: 'Not for sale in this state' },
  'species-blocked': { status: 409, title: 'We do not list this species' },
  'rule-unknown': { status: 409, title: 'Nobody has checked this species here for us' },
  'ticks-missing': { status: 422, title: 'Please read and tick each statement' },
  'trip-unsafe': { status: 409, title: 'The animals would not survive this trip' },
  'not-shipped': { status: 409, title: 'These animals are not shipped there' },
  'packing-open': { status: 409, title: 'How to pack is not settled yet' },
  'dispatch-refused': { status: 409, title: 'This box cannot leave yet' },
  'holds-too-many': { status: 409, title: 'You already hold unpaid orders' },
  'deposit-expired': { status: 409, title: 'The 15 minutes are over' },
  'order-moved': { status: 409, title: 'The order has moved on' },
  'code-wrong': { status: 409, title: 'That code does not match' },
  'balance-unpaid': { status: 409, title: 'The balance is not paid yet' },
  'rating-closed': { status: 409, title: 'This is not open for a rating' },
  'listing-incomplete': { status: 422, title: 'The listing is not complete yet' },
  'version-stale': { status: 409, title: 'It was changed meanwhile' },
  'seller-unready': { status: 409, title: 'The seller is finishing paperwork' },
  'dispute-open': { status: 409, title: 'A payment dispute is open' },
  'storage-full': { status: 507, title: 'There is no room to store that now' },
  'payments-away': { status: 503, title: 'The payment service does not answer' },
  'try-again': { status: 503, title: 'Too busy for a moment' },
  internal: { status: 500, title: 'Something broke on our side' },
} as const

export type ProblemSlug = keyof typeof problems

export interface FieldProblem {
  /** A sentence a beginner can act on. */
  detail: string
  /** JSON pointer into the body (`#/fishCount`), or `query:near` / `path:listingId`. */
  pointer: string
}

export interface ProblemDocument {
  type: string
  title: string
  status: number
  detail: string
  instance?: string
  errors?: FieldProblem[]
  /** Facts the screen may show, e.g. `{ left: 0 }` beside `batch-short`. */
  facts?: Record<string, string | number | boolean>
}

/** Thrown by use cases and policies; the problem handler writes it as application/problem+json. */
export class Problem extends Error {
  readonly slug: ProblemSlug
  readonly status: number
  readonly errors: FieldProblem[] | undefined
  readonly facts: Record<string, string | number | boolean> | undefined

  constructor(
    slug: ProblemSlug,
    detail?: string,
    more?: { errors?: FieldProblem[]; facts?: Record<string, string | number | boolean> },
  ) {
    super(detail ?? problems[slug].title)
    this.name = 'Problem'
    this.slug = slug
    this.status = problems[slug].status
    this.errors = more?.errors
    this.facts = more?.facts
  }
}

export function isProblemSlug(slug: string): slug is ProblemSlug {
  return Object.hasOwn(problems, slug)
}
