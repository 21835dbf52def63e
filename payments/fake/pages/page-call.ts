import { sweepIfDue } from '../acts/sweep'
import type { Answer } from '../http/answer'
import { parseForm, type Form } from '../http/form'
import type { Incoming } from '../http/incoming'
import { takeTurn, type Turn, type World } from '../turn'
import { showChallenge, submitChallenge } from './challenge-page'
import { showCheckout, submitCheckout } from './checkout-page'
import { lostPage } from './frame'
import { showIndex } from './index-page'
import { showOnboarding, submitOnboarding } from './onboarding-page'

type Act = (turn: Turn, id: string, form: Form) => Answer

const acts: Record<string, Act> = {
  'GET /pay': showCheckout,
  'POST /pay': submitCheckout,
  'GET /challenge': showChallenge,
  'POST /challenge': submitChallenge,
  'GET /onboard': showOnboarding,
  'POST /onboard': submitOnboarding,
}

/** The pages a person clicks through; every click is one turn at the books. */
export function answerPageCall(world: World, { method, path, body }: Incoming): Answer {
  sweepIfDue(world)
  if (method === 'GET' && path === '/') return takeTurn(world, showIndex)
  const [, head = '', id = '', more] = path.split('/')
  const act = more === undefined ? acts[`${method} /${head}`] : undefined
  return act && id !== '' ? takeTurn(world, (turn) => act(turn, id, parseForm(body))) : lostPage()
}
