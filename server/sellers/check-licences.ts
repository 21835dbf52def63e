import { Problem, type FieldProblem } from '@/shared/api/problem'
import type { LicenceAnswer } from '@/shared/contracts/sellers'

/** One answer a state, and one for the seller's own. */
export function checkLicences(licences: LicenceAnswer[], ownState: string): void {
  const errors: FieldProblem[] = []
  licences.forEach((licence, at) => {
    if (licences.findIndex((one) => one.state === licence.state) < at) {
      errors.push({ detail: `${licence.state} is answered twice.`, pointer: `#/licences/${at}/state` })
    }
  })
  if (!licences.some((licence) => licence.state === ownState)) {
    errors.push({ detail: `Answer the licence question for ${ownState}.`, pointer: '#/licences' })
  }
  if (errors.length > 0) throw new Problem('fields-invalid', undefined, { errors })
}
