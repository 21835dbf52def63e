import { ApiFailure } from '../failure'
import { openTurn, type Turn } from '../turn'
import { jsonAnswer, type Answer } from './answer'
import { expand } from './expand'
import type { FoundEndpoint } from './find-endpoint'
import { listOf, type Form } from './form'

interface Call {
  form: Form
  fingerprint: string
  accountId: string | null
}

/** Commits the turn together with the answer kept for its key: one line of the books, or none. */
function keep(turn: Turn, fingerprint: string, answer: Answer): Answer {
  const { idempotencyKey: id, requestId } = turn
  if (id !== null) {
    const { status, body } = answer
    const row = { id, fingerprint, keptAtMs: Date.now(), requestId: requestId ?? '', status, body }
    turn.draft.put({ table: 'replies', row })
  }
  turn.world.books.commit(turn.draft)
  return answer
}

/** Runs one act of the API. A refusal that came before the act began is thrown on and not kept. */
export function perform(turn: Turn, found: FoundEndpoint, call: Call): Answer {
  try {
    const object = found.endpoint.answer({ turn, form: call.form, id: found.id, accountId: call.accountId })
    const answer = jsonAnswer(200, expand(turn, object, listOf(call.form, 'expand')))
    return keep(turn, call.fingerprint, answer)
  } catch (error) {
    if (!(error instanceof ApiFailure) || !error.began) throw error
    const kept = error.keeps ? turn : openTurn(turn.world, turn)
    return keep(kept, call.fingerprint, jsonAnswer(error.status, { error: error.body }))
  }
}
