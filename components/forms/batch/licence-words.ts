import type { LicenceAnswer } from '@/shared/contracts/sellers'

/** A farm's licences as one line for a listing: "OH: OH-A 1142; IN: none needed". States still unsure are left out. */
export function licenceWords(licences: readonly LicenceAnswer[]): string {
  return licences
    .flatMap(({ state, answer, number }) => {
      if (answer === 'have') return `${state}: ${number ?? ''}`.trim()
      return answer === 'not-needed' ? `${state}: none needed` : []
    })
    .join('; ')
}
