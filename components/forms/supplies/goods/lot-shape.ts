import type { ListingDraft } from '@/shared/contracts/listings'

export interface LotIssue {
  path: (string | number)[]
  message: string
}

/** One answer a listing needs: where it stands, what counts as an answer, and what is asked while there is none. */
export interface LotRule {
  /** 'harvest.day'; 'tiers.*.unitCents' asks every row. */
  path: string
  fits: (value: unknown) => boolean
  ask: string
  /** False: the answer is not asked for here. */
  when?: (draft: ListingDraft) => boolean
}

type Found = [path: (string | number)[], value: unknown]

function valuesAt(value: unknown, steps: readonly string[], at: (string | number)[]): Found[] {
  const [step, ...rest] = steps
  if (step === undefined) return [[at, value]]
  if (step === '*') {
    return Array.isArray(value)
      ? Array.from<unknown>(value).flatMap((row, index) => valuesAt(row, rest, [...at, index]))
      : []
  }
  const inside =
    typeof value === 'object' && value !== null ? (value as Record<string, unknown>)[step] : undefined
  return valuesAt(inside, rest, [...at, step])
}

/** Answers that are missing or cannot be read, in the order of the rules. */
export function checkShape(draft: ListingDraft, rules: readonly LotRule[]): LotIssue[] {
  return rules
    .filter(({ when }) => when?.(draft) ?? true)
    .flatMap(({ path, fits, ask }) =>
      valuesAt(draft, path.split('.'), [])
        .filter(([, value]) => !fits(value))
        .map(([at]) => ({ path: at, message: ask })),
    )
}

export const text = (most: number) => (value: unknown) =>
  typeof value === 'string' && value.trim() !== '' && value.trim().length <= most
export const freeText = (most: number) => (value: unknown) =>
  value === undefined || (typeof value === 'string' && value.trim().length <= most)
export const oneOf = (choices: readonly string[]) => (value: unknown) =>
  typeof value === 'string' && choices.includes(value)
export const yesNo = (value: unknown) => typeof value === 'boolean'
export const number = (least: number, most: number) => (value: unknown) =>
  typeof value === 'number' && value >= least && value <= most
export const whole = (least: number, most: number) => (value: unknown) =>
  Number.isInteger(value) && number(least, most)(value)
export const free = (fits: (value: unknown) => boolean) => (value: unknown) =>
  value === undefined || fits(value)
export const some = (most: number) => (value: unknown) =>
  Array.isArray(value) && value.length > 0 && value.length <= most
export const day = (value: unknown) => typeof value === 'string' && /^\d{4}-\d{2}-\d{2}$/.test(value)
export const time = (value: unknown) => typeof value === 'string' && /^([01]\d|2[0-3]):[0-5]\d$/.test(value)
