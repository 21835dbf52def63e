import type { ErrorRequestHandler, RequestHandler } from 'express'

import { errnoOf } from '@/db/transaction'
import { log } from '@/server/log'
import { Problem, problems, type ProblemDocument, type ProblemSlug } from '@/shared/api/problem'

const BUSY_ERRNOS = new Set([1213, 1205, 1020, 1040])
const AWAY_CODES = new Set(['ECONNREFUSED', 'ECONNRESET', 'ETIMEDOUT', 'PROTOCOL_CONNECTION_LOST', 'EPIPE'])

function codeOf(error: unknown): string | null {
  for (let at: unknown = error; at instanceof Error; at = at.cause) {
    if ('code' in at && typeof at.code === 'string') return at.code
  }
  return null
}

/** What body parsers and the driver throw, as one of our problems. */
function asProblem(error: unknown): Problem {
  if (error instanceof Problem) return error
  if (error instanceof Error && 'type' in error) {
    if (error.type === 'entity.too.large') return new Problem('too-large')
    if (error.type === 'entity.parse.failed' || error.type === 'request.aborted')
      return new Problem('body-unreadable')
    if (error.type === 'encoding.unsupported' || error.type === 'charset.unsupported')
      return new Problem('wrong-kind')
  }
  if (error instanceof URIError) return new Problem('no-such-path')
  const errno = errnoOf(error)
  if ((errno !== null && BUSY_ERRNOS.has(errno)) || AWAY_CODES.has(codeOf(error) ?? '')) {
    return new Problem(
      'try-again',
      'Our database is catching its breath. Nothing was lost; try again in a few seconds.',
    )
  }
  if (codeOf(error) === 'ENOSPC') return new Problem('storage-full')
  return new Problem('internal', 'It was logged. Nothing you typed is lost; try again in a moment.')
}

export function problemDocument(problem: Problem, instance: string): ProblemDocument {
  return {
    type: `/problems/${problem.slug satisfies ProblemSlug}`,
    title: problems[problem.slug].title,
    status: problem.status,
    detail: problem.message,
    instance,
    ...(problem.errors ? { errors: problem.errors } : {}),
    ...(problem.facts ? { facts: problem.facts } : {}),
  }
}

/** The one place where an error becomes an answer (RFC 9457). */
export const problemHandler: ErrorRequestHandler = (error, req, res, next) => {
  const problem = asProblem(error)
  if (problem.status >= 500) log.error({ err: error, requestId: res.locals.requestId }, problem.slug)
  if (res.headersSent) {
    next(error)
    return
  }
  if (problem.status === 503 || problem.slug === 'key-running') res.setHeader('retry-after', '2')
  const seconds = problem.facts?.retryAfterS
  if (problem.status === 429 && typeof seconds === 'number') res.setHeader('retry-after', String(seconds))
  res.setHeader('cache-control', 'no-store')
  res
    .status(problem.status)
    .type('application/problem+json')
    .send(JSON.stringify(problemDocument(problem, `urn:request:${String(res.locals.requestId)}`)))
}

export const unknownPath: RequestHandler = () => {
  throw new Problem('no-such-path', 'There is nothing at this address.')
}
