import { expect } from 'vitest'

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

/** Every answer taken away, and replaced by what does not fit, is told as a sentence; zod's own words are none. */
export function readsWell(contract: z.ZodType, body: unknown): void {
  const paths = pathsOf(body).filter((path) => !formsOwn.includes(String(path.at(-1))))
  let told = 0
  for (const path of paths) {
    for (const value of [undefined, null, -1, 1e9, Number.NaN, [], 'x'.repeat(5000), '2027-02-30']) {
      for (const [field, message] of Object.entries(issuesOf(contract, changeAt(body, path, value)))) {
        told += 1
        expect(message, `${field} after ${String(value).slice(0, 12)}`).toMatch(/^["A-Z0-9].*[.?]$/s)
        expect(message, `${field} after ${String(value).slice(0, 12)}`).not.toMatch(
          /^(Invalid|Too|Unrecognized|Expected)/,
        )
      }
    }
  }
  expect(told).toBeGreaterThan(paths.length)
}
