import { describe, expect, it } from 'vitest'
import { allEdges } from '@/shared/domain/orders/edges.facts'
import { orderPath, type PathFacts } from '@/shared/domain/orders/order-path'
import { endWords, silenceWords } from '@/shared/domain/orders/order-path-words.facts'
import { cancelReasons, finalStates, orderStates } from '@/shared/domain/orders/states.facts'

const pickup = (given: Partial<PathFacts> = {}): PathFacts => ({
  state: 'reserved',
  party: 'buyer',
  handOver: 'pickup',
  balanceDue: 'at-handover',
  balancePaid: false,
  needsAcceptance: false,
  isPooled: false,
  clock: null,
  ...given,
})

describe('the order path', () => {
  it('shows a pickup order from hold to settlement', () => {
    const path = orderPath(pickup({ state: 'scheduled', clock: { atMs: 42, edge: 'E26' } }))
    expect(path.steps.map((one) => [one.words, one.mark])).toEqual([
      ['Held', 'done'],
      ['Deposit paid', 'done'],
      ['Day agreed', 'now'],
      ['Ready', 'ahead'],
      ['Handed over', 'ahead'],
      ['Settled', 'ahead'],
    ])
    expect(path.move).toEqual({ whose: 'other', words: 'The seller gets them ready.' })
    expect(path.untilMs).toBe(42)
    expect(path.ifNobodyMoves).toMatch(/everything paid goes back/)
  })

  it('shows a shipped order that asks the seller first', () => {
    const path = orderPath(
      pickup({ handOver: 'ship', needsAcceptance: true, state: 'requested', party: 'seller' }),
    )
    expect(path.steps.map((one) => one.step)).toEqual([
      'held',
      'asked',
      'paid',
      'day',
      'ready',
      'sent',
      'arrived',
      'settled',
    ])
    expect(path.move).toEqual({ whose: 'you', words: 'Accept or decline.' })
  })

  it('says of a box what is true of a box', () => {
    const box = pickup({ handOver: 'ship', balanceDue: 'before', balancePaid: true })
    const move = (state: PathFacts['state'], party: PathFacts['party'] = 'buyer') =>
      orderPath({ ...box, state, party }).move
    expect(move('deposit_paid').words).toBe('Choose a ship day.')
    expect(move('ready', 'seller')).toEqual({ whose: 'you', words: 'Check the route, then send the box.' })
    expect(move('dispatched').whose).toBe('nobody')
    expect(move('claim_open')).toEqual({
      whose: 'nobody',
      words: 'We look at what became of the box. If it comes after all, say so.',
    })
    expect(orderPath({ ...box, state: 'dispatched', clock: { atMs: 1, edge: 'E36' } }).ifNobodyMoves).toBe(
      'the box counts as late and a claim opens by itself',
    )
  })

  it('leaves a box that has not come where it was sent, and names no hour', () => {
    const claim = { state: 'claim_open', handOver: 'ship', clock: { atMs: 42, edge: 'E42' } } as const
    const now = (given: Partial<PathFacts>) => {
      const { steps, untilMs, ifNobodyMoves } = orderPath(pickup({ ...claim, ...given }))
      return [steps.find(({ mark }) => mark === 'now')?.step, untilMs, ifNobodyMoves !== '']
    }
    expect(now({})).toEqual(['sent', null, false])
    expect(now({ hasArrived: true })).toEqual(['arrived', 42, true])
  })

  it('asks the buyer for a balance that is due before the day', () => {
    const owing = pickup({ state: 'scheduled', balanceDue: 'before' })
    expect(orderPath(owing).move).toEqual({ whose: 'you', words: 'Pay the balance.' })
    expect(orderPath({ ...owing, balancePaid: true }).move.whose).toBe('other')
  })

  it('tells why an order ended, and promises nothing more', () => {
    const path = orderPath(
      pickup({ state: 'cancelled', reason: 'seller_silent', clock: { atMs: 1, edge: 'E09' } }),
    )
    expect(path.move).toEqual({ whose: 'nobody', words: endWords.seller_silent })
    expect([path.untilMs, path.ifNobodyMoves]).toEqual([null, ''])
    expect(path.steps.every((one) => one.mark === 'ahead')).toBe(true)
  })

  it('marks everything done when settled', () => {
    expect(orderPath(pickup({ state: 'settled' })).steps.every((one) => one.mark === 'done')).toBe(true)
  })

  it('has words for every timer edge and every ending', () => {
    const timed = allEdges.filter((edge) => edge.by.includes('timer')).map((edge) => edge.id)
    expect(Object.keys(silenceWords).sort()).toEqual(timed)
    expect(Object.keys(endWords).sort()).toEqual([...cancelReasons].sort())
  })

  it('knows whose move it is in every state, for both sides and for staff', () => {
    for (const state of orderStates) {
      for (const party of ['buyer', 'seller', 'staff'] as const) {
        const { move, steps } = orderPath(pickup({ state, party, reason: 'admin_stop' }))
        expect(move.words.length).toBeGreaterThan(0)
        const isOnThisPath = !['requested', 'pledged', 'dispatched', 'arrived'].includes(state)
        const isRunning = isOnThisPath && !finalStates.includes(state)
        expect([state, steps.some((one) => one.mark === 'now')]).toEqual([state, isRunning])
      }
    }
  })

  it('never says the same side is both waiting and waited for', () => {
    for (const state of orderStates) {
      const whose = (party: 'buyer' | 'seller') => orderPath(pickup({ state, party })).move.whose
      expect([whose('buyer'), whose('seller')]).not.toEqual(['you', 'you'])
      expect(whose('buyer') === 'you').toBe(whose('seller') === 'other')
    }
  })

  it('says "You" to the one who ended it', () => {
    const end = (party: 'buyer' | 'seller' | 'staff', reason: 'buyer_cancelled' | 'seller_no_show') =>
      orderPath(pickup({ state: 'cancelled', reason, party, clock: null })).move.words
    expect(end('buyer', 'buyer_cancelled')).toBe('You cancelled.')
    expect(end('seller', 'buyer_cancelled')).toBe('The buyer cancelled.')
    expect(end('staff', 'buyer_cancelled')).toBe('The buyer cancelled.')
    expect(end('seller', 'seller_no_show')).toBe('You were not there. Everything paid went back.')
  })
})
