/** What three places of the product say about one listing, one buyer's place and one week. */
export interface Told {
  name: string
  /** The search filter lets it through. */
  isFound: boolean
  /** The seller's own states, and the law there. */
  isServed: boolean
  badge: string
  strip: string
}

const isSafe = (verdict: string) => verdict === 'safe' || verdict === 'safe-with-packs'

/** Where filter, badge and strip contradict each other; empty: nowhere. */
export function disagreements(told: readonly Told[]): string[] {
  return told.flatMap(({ name, isFound, isServed, badge, strip }) => [
    ...(badge === strip ? [] : [`${name}: the badge says ${badge}, the strip ${strip}`]),
    ...(isFound === (isServed && isSafe(badge))
      ? []
      : [`${name}: ${isFound ? '' : 'not '}found, but ${isServed ? badge : 'not served'}`]),
  ])
}
