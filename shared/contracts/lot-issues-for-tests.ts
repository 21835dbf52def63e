import type { z } from 'zod'

export type Path = readonly (string | number)[]

/** A copy with one answer changed; undefined takes it away. */
export function changeAt(body: unknown, path: Path, value: unknown): unknown {
  const copy = structuredClone(body) as Record<string | number, unknown>
  const parent = path.slice(0, -1).reduce((at, step) => at[step] as Record<string | number, unknown>, copy)
  const last = path.at(-1)
  if (last === undefined) return value
  if (value === undefined) delete parent[last]
  else parent[last] = value
  return copy
}

/** What the contract says, by field. Empty: nothing is wrong. */
export function issuesOf(contract: z.ZodType, body: unknown): Record<string, string> {
  const issues = contract.safeParse(body).error?.issues ?? []
  return Object.fromEntries(issues.map((issue) => [issue.path.join('.'), issue.message]))
}

function pathsOf(value: unknown, at: Path = []): Path[] {
  if (typeof value !== 'object' || value === null) return [at]
  const below = Object.entries(value).flatMap(([key, one]) =>
    pathsOf(one, [...at, Array.isArray(value) ? Number(key) : key]),
  )
  return at.length === 0 ? below : [at, ...below]
}

/** Words that a person sends nowhere: identifiers, and the category that the form itself sets. */
const formsOwn = ['category', 'photoId']

/**
 * Takes every answer away and puts in what does not fit: how many complaints came, and those that are no sentence for
 * a beginner but a library's own words.
 */
export function badlyTold(contract: z.ZodType, body: unknown): { told: number; bad: string[] } {
  const paths = pathsOf(body).filter((path) => !formsOwn.includes(String(path.at(-1))))
  const junk = [undefined, null, -1, 1e9, Number.NaN, [], 'x'.repeat(5000), '2027-02-30']
  const all = paths.flatMap((path) =>
    junk.flatMap((value) => Object.entries(issuesOf(contract, changeAt(body, path, value)))),
  )
  const isSentence = (message: string) =>
    /^["A-Z0-9].*[.?]$/s.test(message) && !/^(Invalid|Too|Unrecognized|Expected)/.test(message)
  const bad = all
    .filter(([, message]) => !isSentence(message))
    .map(([field, message]) => `${field}: ${message}`)
  return { told: all.length, bad }
}
