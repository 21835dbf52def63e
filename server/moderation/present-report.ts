import type { ReportRow } from '@/server/moderation/report-store'
import { reportReasons, type MadeReport } from '@/shared/contracts/listing-reports'
import type { OwnListing } from '@/shared/contracts/listings'
import { takeDownReasons } from '@/shared/domain/listings/take-down-reasons'

const isReason = (text: string): text is MadeReport['reason'] =>
  (reportReasons as readonly string[]).includes(text)

/** What was said, never who said it. */
export function presentReport(row: Pick<ReportRow, 'reason' | 'words' | 'createdAt'>): MadeReport {
  return {
    reason: isReason(row.reason) ? row.reason : 'other',
    ...(row.words ? { words: row.words } : {}),
    reportedAt: row.createdAt.toISOString(),
  }
}

/** Why a listing went off sale; nothing where a reviewer's refusal says it already. */
export function presentTakenDown(
  found: { reason: string; note: string | null } | undefined,
): OwnListing['takenDown'] {
  const reason = takeDownReasons.find((one) => one === found?.reason)
  return reason && { reason, ...(found?.note ? { note: found.note } : {}) }
}
