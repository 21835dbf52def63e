import type { z } from 'zod'

import type { FieldProblem } from '@/shared/api/problem'

function pointer(at: string, path: PropertyKey[]): string {
  const steps = path.map((step) => String(step).replaceAll('~', '~0').replaceAll('/', '~1'))
  return at === '#' ? `#/${steps.join('/')}` : `${at}:${steps.join('.')}`
}

function sentence(issue: z.core.$ZodIssue): string {
  if (issue.code === 'unrecognized_keys') return `Not expected here: ${issue.keys.join(', ')}.`
  if (issue.code === 'invalid_type' && issue.message.startsWith('Invalid input')) return 'This is needed.'
  return issue.message
}

/** Every issue of a failed parse, one line a field. `at` is `#` for bodies, `query` or `path` otherwise. */
export function fieldProblems(error: z.ZodError, at: string): FieldProblem[] {
  return error.issues.map((issue) => ({ detail: sentence(issue), pointer: pointer(at, issue.path) }))
}
