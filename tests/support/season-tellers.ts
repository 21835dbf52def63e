import type { ShippedThroughYear } from '@/shared/contracts/shipping'
import { comingMonday } from '@/shared/times/coming-monday'

interface Saying {
  verdict: string
  /** The Monday of the next safe week, where this one is not and the year has one. */
  nextMonday?: string | undefined
}

/** What three places of the product say about one listing, one buyer's place and one week. */
export interface Told {
  name: string
  /** The search filter lets it through. */
  isFound: boolean
  /** The seller's own states, and the law there. */
  isServed: boolean
  badge: Saying
  strip: Saying
}

const isSafe = (verdict: string) => verdict === 'safe' || verdict === 'safe-with-packs'

/** What somebody reads off the strip, going to the right from the week asked for. */
export function readStrip({ weeks, week, monday }: ShippedThroughYear): Saying {
  const verdict = weeks[week - 1] ?? 'none'
  const ahead = [...weeks.slice(week - 1), ...weeks.slice(0, week - 1)].findIndex(isSafe)
  if (ahead <= 0) return { verdict }
  return { verdict, nextMonday: comingMonday(monday, ((week - 1 + ahead) % weeks.length) + 1) }
}

const words = ({ verdict, nextMonday }: Saying) => `${verdict}${nextMonday ? `, then ${nextMonday}` : ''}`

/** Where filter, badge and strip contradict each other; empty: nowhere. */
export function disagreements(told: readonly Told[]): string[] {
  return told.flatMap(({ name, isFound, isServed, badge, strip }) => [
    ...(words(badge) === words(strip)
      ? []
      : [`${name}: the badge says ${words(badge)}, the strip ${words(strip)}`]),
    ...(isFound === (isServed && isSafe(badge.verdict))
      ? []
      : [`${name}: ${isFound ? '' : 'not '}found, but ${isServed ? badge.verdict : 'not served'}`]),
  ])
}
