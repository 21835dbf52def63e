import { describe, expect, it } from 'vitest'
import { clocks } from '@/shared/domain/orders/clocks.facts'
import { allEdges, edges, type StockPlace } from '@/shared/domain/orders/edges.facts'
import { guardTexts } from '@/shared/domain/orders/guards.facts'
import { moneyActs } from '@/shared/domain/orders/money-acts.facts'
import { nextEdges } from '@/shared/domain/orders/next-edges'
import { cancelReasons, finalStates, orderStates, type OrderState } from '@/shared/domain/orders/states.facts'

const startPlaces: Partial<Record<OrderState, StockPlace>> = {
  reserved: 'held',
  requested: 'held',
  pledged: 'pledged',
  deposit_paid: 'sold',
  scheduled: 'sold',
  weather_hold: 'sold',
  ready: 'sold',
  dispatched: 'shipped',
  handed_over: 'delivered',
  arrived: 'delivered',
}

function reach(start: readonly OrderState[], step: (state: OrderState) => OrderState[]): Set<OrderState> {
  const seen = new Set(start)
  for (const state of seen) for (const next of step(state)) seen.add(next)
  return seen
}

describe('the order machine', () => {
  it('has 13 states and 56 edges, numbered without a gap', () => {
    expect(orderStates).toHaveLength(13)
    expect(allEdges.map((edge) => edge.id)).toEqual(
      Array.from({ length: 56 }, (_, at) => `E${String(at + 1).padStart(2, '0')}`),
    )
    for (const [id, edge] of Object.entries(edges)) expect(edge.id).toBe(id)
  })

  it('reaches every state from the beginning', () => {
    const from = (state: OrderState | null) => allEdges.filter((e) => e.from === state).map((e) => e.to)
    expect(reach(from(null), from).size).toBe(13)
  })

  it('can end from every state', () => {
    const before = (state: OrderState) => allEdges.flatMap((e) => (e.to === state && e.from ? [e.from] : []))
    expect(reach(finalStates, before).size).toBe(13)
  })

  it('lets no state rest for ever: each that is not final has a timer edge', () => {
    const timed = new Set(allEdges.filter((edge) => edge.by.includes('timer')).map((edge) => edge.from))
    for (const state of orderStates)
      expect([state, timed.has(state)]).toEqual([state, !finalStates.includes(state)])
  })

  it('lets nothing leave a final state', () => {
    for (const edge of allEdges) expect(edge.from !== null && finalStates.includes(edge.from)).toBe(false)
  })

  it('gives a reason to every cancellation and to nothing else, and uses every reason', () => {
    for (const edge of allEdges)
      expect([edge.id, edge.reason !== undefined]).toEqual([edge.id, edge.to === 'cancelled'])
    expect(new Set(allEdges.flatMap((edge) => edge.reason ?? []))).toEqual(new Set(cancelReasons))
  })

  it('uses every guard and every act of money', () => {
    expect(new Set(allEdges.flatMap((edge) => edge.guard ?? []))).toEqual(new Set(Object.keys(guardTexts)))
    expect(new Set(allEdges.map((edge) => edge.money))).toEqual(new Set(Object.keys(moneyActs)))
  })

  it('takes animals only from where the state keeps them, and puts them where the next state keeps them', () => {
    for (const { id, from, to, stock } of allEdges) {
      const outOf = stock.filter(([, sign]) => sign === -1).map(([place]) => place)
      const into = stock.filter(([, sign]) => sign === 1).map(([place]) => place)
      const source = from === null ? 'free' : startPlaces[from]
      expect([id, outOf.every((place) => place === source)]).toEqual([id, true])
      if (to === 'cancelled')
        expect([id, outOf.length, into.every((place) => place === 'free')]).toEqual([id, 1, true])
      else if (to !== 'settled' && to !== 'claim_open') {
        const target = startPlaces[to]
        expect([id, source === target ? into : into.length === 1 && into[0] === target]).toEqual([
          id,
          source === target ? [] : true,
        ])
      } else expect([id, stock]).toEqual([id, []])
    }
  })

  it('sends money to a seller only on settling, and nothing on opening a claim', () => {
    for (const edge of allEdges) {
      const isTransfer = edge.money === 'transfer' || edge.money.endsWith('-transfer')
      expect([edge.id, isTransfer]).toEqual([edge.id, edge.to === 'settled'])
      if (edge.to === 'claim_open') expect([edge.id, edge.money]).toEqual([edge.id, 'none'])
    }
  })

  it('never takes a cent from the buyer when the fault is the seller’s or the admin stops it', () => {
    const sellersFault = [
      'seller_cancelled',
      'seller_missed_day',
      'seller_no_show',
      'admin_stop',
      'never_scheduled',
    ]
    for (const { id, reason, money } of allEdges) {
      if (!reason || !sellersFault.includes(reason)) continue
      expect([id, /^(refund-all|refund-deposit|void-or-refund-all)$/.test(money)]).toEqual([id, true])
    }
  })

  it('answers who may do what next', () => {
    const ids = (from: OrderState | null, actor: Parameters<typeof nextEdges>[1]) =>
      nextEdges(from, actor).map((edge) => edge.id)
    expect(ids(null, 'buyer')).toEqual(['E01'])
    expect(ids('requested', 'seller')).toEqual(['E07', 'E08'])
    expect(ids('requested', 'buyer')).toEqual(['E10'])
    expect(ids('deposit_paid', 'buyer')).toEqual(['E14', 'E15'])
    expect(ids('ready', 'timer')).toEqual(['E33', 'E34'])
    expect(ids('settled', 'admin')).toEqual([])
  })

  it('states the clocks of the trade', () => {
    expect(clocks.checkoutHold.minutes).toBe(15)
    expect(clocks.sellerAnswer).toMatchObject({ minutes: 2880, produceMinutes: 720 })
    expect(clocks.authorisationLife.minutes).toBeLessThan(7 * 24 * 60)
    expect(clocks.lateBox.minutes).toBe(36 * 60)
  })
})
