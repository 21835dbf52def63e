import type { FormError } from '@/components/ui/error-summary'
import type { RoutePaper } from '@/shared/contracts/shipments'

/** A paper as it is typed; '' is not answered yet. */
export type PaperTyping = RoutePaper

export const blankPaper = (kind: string): PaperTyping => ({
  kind,
  number: '',
  issuer: '',
  issuedOn: '',
  expiresOn: '',
})

/** The papers named so far, then a row for each that is needed and not named yet. */
export function paperRows(papers: readonly RoutePaper[], needed: readonly string[]): PaperTyping[] {
  const missing = needed.filter((kind) => !papers.some((paper) => paper.kind === kind))
  return [...papers, ...missing.map(blankPaper)]
}

/** Nothing but its name: not at hand yet, so not sent. */
const isUntouched = ({ number, issuer, issuedOn, expiresOn }: PaperTyping) =>
  [number, issuer, issuedOn, expiresOn].every((text) => text.trim() === '')

export function namedPapers(rows: readonly PaperTyping[]): RoutePaper[] {
  return rows
    .filter((row) => !isUntouched(row))
    .map((row) => ({
      ...row,
      kind: row.kind.trim(),
      number: row.number.trim(),
      issuer: row.issuer.trim(),
    }))
}

export const paperFieldId = (at: number, part: keyof PaperTyping) => `paper-${at}-${part}`

export function paperErrors(rows: readonly PaperTyping[]): FormError[] {
  return rows.flatMap((row, at) => {
    if (isUntouched(row)) return []
    const wrong = (part: keyof PaperTyping, message: string): FormError => ({
      fieldId: paperFieldId(at, part),
      message,
    })
    return [
      row.kind.trim().length < 2 ? wrong('kind', 'Which paper?') : null,
      row.number.trim() === '' ? wrong('number', 'Its number.') : null,
      row.issuer.trim().length < 2 ? wrong('issuer', 'Who issued it?') : null,
      row.issuedOn === '' ? wrong('issuedOn', 'On which day was it issued?') : null,
      row.expiresOn === '' ? wrong('expiresOn', 'Until which day is it good?') : null,
      row.issuedOn !== '' && row.expiresOn !== '' && row.expiresOn < row.issuedOn
        ? wrong('expiresOn', 'It cannot expire before it was issued.')
        : null,
    ].filter((one) => one !== null)
  })
}
