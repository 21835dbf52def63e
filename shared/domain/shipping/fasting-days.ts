import type { SourceKey } from '@/shared/sources'

/**
 * Days between choosing a ship day and the day itself: fish go 24 to 48 hours without food before they travel, and the
 * seller has to hear of it first. House rule by the source; worms keep it too, so that one rule holds for all.
 */
export const FASTING_DAYS = 2
export const fastingSource: SourceKey = 'mx392'
