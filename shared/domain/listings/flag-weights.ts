/** Why somebody should look, by the part of a flag before its colon. House weights. */
const weights = new Map(
  Object.entries({
    'names-blocked': 60,
    'photo-of-another': 50,
    'removed-before': 40,
    'form-needs-licence': 40,
    'permit-plant': 40,
    'not-raised-in-us': 40,
    'words-hold': 25,
    'weight-differs': 10,
    'protected-papers': 40,
    'hides-for': 30,
    'names-other': 25,
    contact: 20,
    'law-unknown': 15,
    'licence-unsure': 15,
    'photo-date-differs': 10,
    'photo-used-before': 10,
    edit: 10,
    'first-listing': 10,
    new: 5,
  }),
)

const MOST_RISK = 1000

/** The flags of a listing version as one number, so that the queue can show the riskiest first. */
export function riskOfFlags(flags: readonly string[]): number {
  const sum = flags.reduce((risk, flag) => risk + (weights.get(flag.split(':')[0] ?? '') ?? 0), 0)
  return Math.min(MOST_RISK, sum)
}
