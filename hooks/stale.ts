const SECOND = 1000

/** How long an answer counts as fresh, by name. */
export const STALE = {
  /** Changes with every act of somebody else: orders, stock. */
  live: 5 * SECOND,
  halfMinute: 30 * SECOND,
  minutes: 5 * 60 * SECOND,
  /** Facts that change with a release. */
  day: 24 * 3600 * SECOND,
} as const
