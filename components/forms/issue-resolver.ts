import { set, type FieldErrors, type FieldValues, type Resolver } from 'react-hook-form'

import { issueSentence } from './issue-sentence'

import type { z } from 'zod'

interface Options {
  /** Fields that hold a list: an error of the list itself stands at its root, beside those of its rows. */
  lists: readonly string[]
  /** Fields whose one control answers for all that is inside them. */
  whole?: readonly string[]
  /** What to ask where the contract only says that something is missing; rows are named without their number. */
  asks?: Readonly<Record<string, string>>
}

/** Makes a form's resolver from a check that answers with parser issues whose paths are the form's own names. */
export function issueResolver<T extends FieldValues>(
  check: (typing: T) => readonly z.core.$ZodIssue[],
  { lists, whole = [], asks = {} }: Options,
): Resolver<T> {
  return (typing) => {
    const issues = check(typing)
    if (issues.length === 0) return { values: typing, errors: {} }
    const errors = {}
    const seen = new Set<string>()
    for (const issue of issues) {
      const full = issue.path.map(String).join('.')
      const path = whole.find((field) => full.startsWith(`${field}.`)) ?? full
      const name = lists.includes(path) ? `${path}.root` : path
      if (seen.has(name)) continue // one sentence a field; the first is the nearest
      seen.add(name)
      set(errors, name, { type: issue.code, message: issueSentence(issue, asks[path.replace(/\.\d+/g, '')]) })
    }
    return { values: {}, errors: errors as FieldErrors<T> }
  }
}
