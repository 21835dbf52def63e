import type { ReportRow } from '@/server/moderation/report-store'
import { reportReasons, type MadeReport } from '@/shared/contracts/listing-reports'

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
