import type { z } from 'zod'

/** One sentence for the person who typed: the contract's own words, or plain ones where the parser speaks for itself. */
export function issueSentence(issue: z.core.$ZodIssue): string {
  if (issue.code === 'unrecognized_keys') return `Not expected here: ${issue.keys.join(', ')}.`
  if (!issue.message.startsWith('Invalid')) return issue.message
  const given = issue.input
  const isEmpty = given === undefined || given === null || given === ''
  if (isEmpty) return 'This is needed.'
  if (issue.code === 'invalid_format' && issue.format === 'date') return 'A day, please.'
  return 'This could not be read. Please type it another way.'
}
