const day = 24 * 60 * 60_000

/** How long what concerns ratings stays open, in ms. House rules, all of them. */
export const ratingTimes = {
  /** After it was given, the buyer may change a rating. */
  editMs: 14 * day,
  /** After the hand-over, the buyer is asked how many are alive. */
  survivalAskedMs: 7 * day,
  /** After it was asked, an answer is still about day 7. */
  survivalOpenMs: 14 * day,
  /** After it was answered, the number may be corrected. */
  survivalCorrectMs: 7 * day,
} as const
