// `npm run reference`: every published figure against ours; mean, 90th percentile and greatest error a subject.
import { boxChecks } from '@/tests/reference/checks/box-checks'
import { errorOf, type Check } from '@/tests/reference/checks/check'
import { climateChecks } from '@/tests/reference/checks/climate-checks'
import { distanceChecks } from '@/tests/reference/checks/distance-checks'
import { growthChecks } from '@/tests/reference/checks/growth-checks'
import { normalsChecks } from '@/tests/reference/checks/normals-checks'
import { transportChecks } from '@/tests/reference/checks/transport-checks'
import { waterChecks } from '@/tests/reference/checks/water-checks'

const subjects: Readonly<Record<string, readonly Check[]>> = {
  water: waterChecks,
  transport: transportChecks,
  boxes: boxChecks,
  growth: growthChecks,
  distance: distanceChecks,
  climate: climateChecks,
  normals: normalsChecks,
}

/** Errors as a share of what each figure is allowed: subjects of different units stand side by side. */
function line(subject: string, checks: readonly Check[]): string {
  const shares = checks.map((check) => errorOf(check) / check.within).sort((a, b) => a - b)
  const mean = shares.reduce((sum, share) => sum + share, 0) / shares.length
  const p90 = shares[Math.ceil(shares.length * 0.9) - 1] ?? NaN
  const worst = checks.reduce((a, b) => (errorOf(b) / b.within > errorOf(a) / a.within ? b : a))
  const cells = [mean, p90, shares.at(-1) ?? NaN].map((share) => `${(share * 100).toFixed(0)} %`.padStart(7))
  return `${subject.padEnd(10)}${String(checks.length).padStart(6)}${cells.join('')}   ${worst.what}`
}

console.log('Errors as a share of the tolerance that each figure carries with its reason.')
console.log(
  `${'subject'.padEnd(10)}${'checks'.padStart(6)}${['mean', 'p90', 'max'].map((one) => one.padStart(7)).join('')}   worst`,
)
for (const [subject, checks] of Object.entries(subjects)) console.log(line(subject, checks))

const failed = Object.values(subjects)
  .flat()
  .filter((check) => !(errorOf(check) <= check.within))
for (const check of failed)
  console.error(
    `Outside: ${check.what}, ${check.published} ± ${check.within} (${check.from}), ours ${check.ours()}`,
  )
process.exitCode = failed.length > 0 ? 1 : 0
