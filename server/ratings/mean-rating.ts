const MARKS_A_RATING = 3

/** Mean of all marks, 1 to 5; 0 before the first. */
export function meanRating(row: { ratingCount: number; ratingSum: number }): number {
  return row.ratingCount > 0 ? row.ratingSum / (MARKS_A_RATING * row.ratingCount) : 0
}
