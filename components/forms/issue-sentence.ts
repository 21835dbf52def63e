import type { z } from 'zod'

/**
 * One sentence for the person who typed: the contract's own words, or plain ones where the parser speaks for itself.
 * `ask` is the field's question, used when all the parser knows is that an answer is missing or of another kind.
 */
export function issueSentence(issue: z.core.$ZodIssue, ask?: string): string {
  if (issue.code === 'unrecognized_keys') return `Not expected here: ${issue.keys.join(', ')}.`
  if (!issue.message.startsWith('Invalid')) return issue.message
  const given = issue.input
  const isEmpty = given === undefined || given === null || given === ''
  if (ask) return isEmpty ? ask : `That could not be read. ${ask}`
  return isEmpty ? 'This is needed.' : 'This could not be read. Please type it another way.'
}
