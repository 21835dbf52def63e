import { setTimeout as pause } from 'node:timers/promises'
import { sweepIfDue } from '../acts/sweep'
import { ApiFailure } from '../failure'
import { newId } from '../ids'
import { API_VERSION } from '../objects/event'
import { openTurn, type World } from '../turn'
import { jsonAnswer, type Answer } from './answer'
import type { Faults } from './faults'
import { findEndpoint } from './find-endpoint'
import { parseForm } from './form'
import { fingerprintOf, keptReply, type KeysInUse } from './idempotency'
import type { Incoming } from './incoming'
import { perform } from './perform'
import { checkParameters } from './shape'

export interface Desk {
  world: World
  faults: Faults
  keysInUse: KeysInUse
}

interface Cause {
  requestId: string
  idempotencyKey: string | null
}

function checkSecretKey({ headers }: Incoming): void {
  if (/^Bearer sk_test_\S+$/.test(headers.authorization ?? '')) return
  const message = 'Invalid API Key provided: this practice processor takes keys that begin with sk_test_.'
  throw new ApiFailure(401, { type: 'invalid_request_error', message })
}

function answerOnce({ world }: Desk, incoming: Incoming, cause: Cause): Answer {
  checkSecretKey(incoming)
  const { method, path, headers } = incoming
  const found = findEndpoint(method, path)
  const form = parseForm(method === 'POST' ? incoming.body : incoming.query)
  checkParameters(form, found.endpoint.accepts)
  sweepIfDue(world)
  const turn = openTurn(world, cause)
  const fingerprint = fingerprintOf(method, path, form)
  const reply =
    cause.idempotencyKey === null ? null : keptReply(turn.draft, cause.idempotencyKey, fingerprint)
  if (!reply) return perform(turn, found, { form, fingerprint, accountId: headers['stripe-account'] ?? null })
  return {
    status: reply.status,
    headers: {
      'content-type': 'application/json',
      'idempotent-replayed': 'true',
      'original-request': reply.requestId,
    },
    body: reply.body,
  }
}

function errorAnswer(status: number, type: string, message: string): Answer {
  return jsonAnswer(status, { error: { type, message } })
}

/** Null: the line breaks. */
async function answerWithFault(desk: Desk, incoming: Incoming, cause: Cause): Promise<Answer | null> {
  const fault = desk.faults.takeFor(incoming.method, incoming.path)
  if (fault?.kind === 'cut') return null
  if (fault?.kind === 'fail') return errorAnswer(500, 'api_error', 'Planted fault: nothing was done.')
  if (fault?.kind === 'rate-limit')
    return errorAnswer(429, 'invalid_request_error', 'Planted fault: too many requests.')
  if (fault?.kind === 'slow') await pause(fault.ms)
  const answer = answerOnce(desk, incoming, cause)
  if (fault?.kind === 'slow-reply') await pause(fault.ms)
  return fault?.kind === 'lost-reply' ? null : answer
}

function failureAnswer(error: unknown): Answer {
  if (error instanceof ApiFailure) return jsonAnswer(error.status, { error: error.body })
  console.error(error)
  return errorAnswer(500, 'api_error', 'The practice processor has a fault of its own; its log says which.')
}

/** Answers one call of the API; null: the line breaks without an answer. */
export async function answerApiCall(desk: Desk, incoming: Incoming): Promise<Answer | null> {
  const key = incoming.method === 'POST' ? (incoming.headers['idempotency-key'] ?? null) : null
  const cause: Cause = { requestId: newId('req'), idempotencyKey: key }
  const answer = await desk.keysInUse
    .hold(key, () => answerWithFault(desk, incoming, cause))
    .catch((error: unknown) => failureAnswer(error))
  const common = {
    'request-id': cause.requestId,
    'stripe-version': incoming.headers['stripe-version'] ?? API_VERSION,
    ...(key === null ? {} : { 'idempotency-key': key }),
  }
  return answer && { ...answer, headers: { ...common, ...answer.headers } }
}
