import { editableUntil, survivalOpenUntil } from '@/server/ratings/rating-policy'
import type { RatingRow } from '@/server/ratings/rating-store'
import { shortName } from '@/server/ratings/short-name'
import type { SurvivalRow } from '@/server/ratings/survival-store'
import type { HidingReason, ShownRating, ShownSurvival } from '@/shared/contracts/ratings'

/** Words, or the reason why a moderator hid them: never both, whoever looks. */
const words = (said: string | null, hidden: string | null) => (said && !hidden ? { words: said } : {})

export function presentRating(row: RatingRow, buyerName: string | undefined): ShownRating {
  return {
    ratingId: row.publicId,
    buyerName: buyerName ? shortName(buyerName) : 'A former member',
    marks: { fish: row.fishMark, count: row.countMark, contact: row.contactMark },
    ...words(row.words, row.wordsHidden),
    ...(row.wordsHidden ? { wordsHidden: row.wordsHidden as HidingReason } : {}),
    writtenAt: row.createdAt.toISOString(),
    ...(row.editedAt ? { editedAt: row.editedAt.toISOString() } : {}),
    editableUntil: editableUntil(row).toISOString(),
    ...(row.repliedAt
      ? {
          reply: {
            ...words(row.reply, row.replyHidden),
            ...(row.replyHidden ? { hidden: row.replyHidden as HidingReason } : {}),
            at: row.repliedAt.toISOString(),
          },
        }
      : {}),
  }
}

export function presentSurvival(row: SurvivalRow): ShownSurvival {
  return {
    handedOver: row.handedOver,
    askedFrom: row.dueAt.toISOString(),
    openUntil: survivalOpenUntil(row).toISOString(),
    ...(row.alive === null ? {} : { alive: row.alive }),
  }
}
