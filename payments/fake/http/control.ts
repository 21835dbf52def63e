import { timingSafeEqual } from 'node:crypto'
import { changeAccount, finishOnboarding } from '../acts/change-account'
import { closeDispute, openDispute } from '../acts/open-dispute'
import { sweep } from '../acts/sweep'
import type { AccountRow } from '../books/rows'
import { presentAccount } from '../objects/account'
import { platformBalance } from '../objects/balance'
import { presentDispute } from '../objects/dispute'
import { takeTurn, type World } from '../turn'
import type { Courier } from '../webhooks/courier'
import { jsonAnswer, type Answer } from './answer'
import { ControlBody } from './control-body'
import { faultKinds, type Faults } from './faults'
import type { Incoming } from './incoming'

export interface Controls {
  world: World
  faults: Faults
  courier: Courier
  /** Closes the door for a while: connections are refused. */
  refuseConnections(ms: number): void
}

type Act = (controls: Controls, id: string, body: ControlBody) => object

function found<T>(row: T | undefined, id: string): T {
  if (row === undefined) throw new Error(`there is no ${id}`)
  return row
}

function accountChange(account: AccountRow, body: ControlBody): Partial<AccountRow> {
  return {
    payoutsEnabled: body.flag('payoutsEnabled') ?? account.payoutsEnabled,
    chargesEnabled: body.flag('chargesEnabled') ?? account.chargesEnabled,
    detailsSubmitted: body.flag('detailsSubmitted') ?? account.detailsSubmitted,
  }
}

const acts: Record<string, Act> = {
  'POST faults': ({ faults }, _id, body) => {
    const kind = body.choice('kind', faultKinds)
    faults.plant({
      kind,
      match: body.text('match', ''),
      times: body.number('times', 1),
      ms: body.number('ms', 0),
    })
    return { planted: kind }
  },
  'DELETE faults': ({ faults }) => {
    faults.clear()
    return { planted: null }
  },
  'POST refuse-connections': ({ refuseConnections }, _id, body) => {
    const ms = body.number('ms')
    refuseConnections(ms)
    return { ms }
  },
  'POST clock': ({ world }, _id, body) => {
    world.clock.setOffset(body.number('offsetMs'))
    takeTurn(world, sweep)
    return { offsetMs: world.clock.offset(), nowS: world.clock.nowS() }
  },
  'POST funds-delay': ({ world }, _id, body) => {
    world.settings.fundsDelayHours = body.number('hours')
    return { hours: world.settings.fundsDelayHours }
  },
  'POST accounts': ({ world }, id, body) =>
    takeTurn(world, (turn) => {
      const account = found(turn.draft.get('accounts', id), id)
      return presentAccount(turn, changeAccount(turn, account, accountChange(account, body)))
    }),
  'POST onboarding': ({ world }, id) =>
    takeTurn(world, (turn) =>
      presentAccount(turn, finishOnboarding(turn, found(turn.draft.get('accounts', id), id))),
    ),
  'POST payouts': ({ world }, id, body) =>
    takeTurn(world, (turn) => {
      const account = found(turn.draft.get('accounts', id), id)
      const balance = account.balance - body.number('cents')
      if (balance < 0) throw new Error('the account does not hold that much')
      turn.draft.put({ table: 'accounts', row: { ...account, balance } })
      return { balance }
    }),
  'POST disputes': ({ world }, id, body) =>
    takeTurn(world, (turn) => {
      const charge = found(turn.draft.get('charges', id), id)
      return presentDispute(turn, openDispute(turn, charge, body.text('reason', 'product_not_received')))
    }),
  'POST dispute-outcomes': ({ world }, id, body) =>
    takeTurn(world, (turn) => {
      const dispute = found(turn.draft.get('disputes', id), id)
      return presentDispute(turn, closeDispute(turn, dispute, body.choice('outcome', ['lost', 'won'])))
    }),
  'POST webhooks': ({ courier }, id, body) => {
    if (id !== '') courier.resend(id)
    courier.duplicateNext(body.number('duplicateNext', 0))
    courier.loseNext(body.number('loseNext', 0))
    courier.hold(body.flag('held') ?? false)
    return { held: body.flag('held') ?? false }
  },
  'GET state': ({ world }) =>
    takeTurn(world, (turn) => ({
      nowS: turn.nowS,
      ...platformBalance(turn),
      waitingWebhooks: turn.draft.all('deliveries').filter((row) => row.state === 'waiting').length,
    })),
}

function isTokenGood(expected: string, given: string | undefined): boolean {
  const a = Buffer.from(expected)
  const b = Buffer.from(given ?? '')
  return a.length === b.length && timingSafeEqual(a, b)
}

/** `/_control/<what>[/<id>]`, for tests only: without the token given at the start these paths do not exist. */
export function answerControlCall(controls: Controls, { method, path, headers, body }: Incoming): Answer {
  const expected = controls.world.settings.controlToken
  const [, , what = '', id = ''] = path.split('/')
  const act = acts[`${method} ${what}`]
  if (expected === null || !act || !isTokenGood(expected, headers['x-control-token'])) {
    return jsonAnswer(404, { error: 'nothing here' })
  }
  try {
    return jsonAnswer(200, act(controls, id, new ControlBody(body)))
  } catch (error) {
    return jsonAnswer(400, { error: error instanceof Error ? error.message : String(error) })
  }
}
