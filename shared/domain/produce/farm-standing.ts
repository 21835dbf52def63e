import { newestThreshold } from '@/shared/domain/produce/farm-thresholds.facts'

export const farmStandings = ['not-covered', 'qualified-exempt', 'covered', 'unknown'] as const
/** What the grower says of the farm under the produce safety rule. Nobody is exempt from selling safe food. */
export type FarmStanding = (typeof farmStandings)[number]

export interface FarmAddress {
  name: string
  street: string
  city: string
  state: string
  zip: string
}

export interface StandingJudgement {
  /** Printed on the listing, the label and the receipt. null: nothing must be shown. */
  shows: string | null
  /** What keeps the claim from being used. */
  fault: string | null
  /** What the grower should know; not a block. */
  caution: string | null
}

const dollars = (id: Parameters<typeof newestThreshold>[0]) => {
  const { dollars: sum, years } = newestThreshold(id)
  return `$${sum.toLocaleString('en-US')} (${years})`
}

const isComplete = (farm: FarmAddress) =>
  [farm.name, farm.street, farm.city].every((part) => part.trim() !== '') &&
  /^[A-Z]{2}$/.test(farm.state) &&
  /^\d{5}$/.test(farm.zip)

/** What a standing asks of a listing. A qualified exempt farm shows its full business address, or cannot claim it. */
export function judgeStanding(standing: FarmStanding, farm: FarmAddress | null): StandingJudgement {
  const nothing = { shows: null, fault: null, caution: null }
  if (standing === 'covered') return nothing
  if (standing === 'not-covered') {
    return {
      ...nothing,
      caution: `This is for farms below ${dollars('not-covered')} of average yearly produce sales over three years. Safe food is your duty at every size.`,
    }
  }
  if (standing === 'unknown') {
    return {
      ...nothing,
      caution:
        'Ask your state department of agriculture whether the produce safety rule covers you. You may sell meanwhile; safe food is your duty at every size.',
    }
  }
  if (!farm || !isComplete(farm)) {
    return {
      ...nothing,
      fault:
        'A qualified exempt farm shows its name and full business address to buyers. Give both, or choose another answer.',
    }
  }
  return {
    shows: `${farm.name}, ${farm.street}, ${farm.city}, ${farm.state} ${farm.zip}`,
    fault: null,
    caution: `Your farm name and address become public on the listing, the label and the receipt. This is for farms below ${dollars('qualified-exempt')} of all food sales, more than half to people who eat it or to shops nearby.`,
  }
}

/** Whether produce sales, averaged over three years, are past the newest sum we hold for farms that are not covered. */
export function isPastNotCovered(averageCents: number): boolean {
  return averageCents > newestThreshold('not-covered').dollars * 100
}
