import type { ClockId } from '@/shared/domain/orders/clocks.facts'
import type { GuardKey } from '@/shared/domain/orders/guards.facts'
import type { MoneyAct } from '@/shared/domain/orders/money-acts.facts'
import type { CancelReason, OrderState } from '@/shared/domain/orders/states.facts'

/** `both`: the two parties agree. `payment` and `carrier` are events from outside, `timer` and `system` our own. */
export type EdgeActor = 'buyer' | 'seller' | 'both' | 'timer' | 'payment' | 'carrier' | 'system' | 'admin'
export type StockPlace = 'free' | 'held' | 'pledged' | 'sold' | 'shipped' | 'delivered'
/** Times the order's quantity. */
export type StockShift = readonly [place: StockPlace, sign: 1 | -1]
export type ClaimType =
  | 'doa'
  | 'short_count'
  | 'wrong_item'
  | 'wrong_species'
  | 'late_or_lost'
  | 'handover_unclear'
  | 'quality'
  | 'admin'

export interface Edge {
  id: string
  /** null: the order begins. */
  from: OrderState | null
  to: OrderState
  reason?: CancelReason
  by: readonly EdgeActor[]
  guard: GuardKey | null
  /** The wait that starts with the edge, or that made a timer take it. */
  clock: ClockId | null
  money: MoneyAct
  stock: readonly StockShift[]
  /** Set where the edge opens a claim of a fixed type. */
  claimType?: ClaimType
  /** After this stop the animals may go back to free, case by case; until then they are out of the batch. */
  mayFree?: true
}

// prettier-ignore
const table = {
  E01: { id: 'E01', from: null, to: 'reserved', by: ['buyer'], guard: 'may-reserve', clock: 'checkoutHold', money: 'none', stock: [['free', -1], ['held', 1]] },
  E02: { id: 'E02', from: 'reserved', to: 'cancelled', reason: 'hold_expired', by: ['timer'], guard: 'hold-over', clock: 'checkoutHold', money: 'cancel-checkout', stock: [['held', -1], ['free', 1]] },
  E03: { id: 'E03', from: 'reserved', to: 'cancelled', reason: 'buyer_left', by: ['buyer'], guard: null, clock: null, money: 'cancel-checkout', stock: [['held', -1], ['free', 1]] },
  E04: { id: 'E04', from: 'reserved', to: 'requested', by: ['payment'], guard: 'payment-good-ask', clock: 'sellerAnswer', money: 'authorise-deposit', stock: [] },
  E05: { id: 'E05', from: 'reserved', to: 'deposit_paid', by: ['payment'], guard: 'payment-good-instant', clock: 'neverScheduled', money: 'capture-deposit', stock: [['held', -1], ['sold', 1]] },
  E06: { id: 'E06', from: 'reserved', to: 'pledged', by: ['payment'], guard: 'payment-good-pool', clock: 'poolFreeze', money: 'capture-base-tier', stock: [['held', -1], ['pledged', 1]] },
  E07: { id: 'E07', from: 'requested', to: 'deposit_paid', by: ['seller'], guard: 'answer-in-time', clock: 'neverScheduled', money: 'capture-authorised', stock: [['held', -1], ['sold', 1]] },
  E08: { id: 'E08', from: 'requested', to: 'cancelled', reason: 'seller_declined', by: ['seller'], guard: 'reason-code', clock: null, money: 'void', stock: [['held', -1], ['free', 1]] },
  E09: { id: 'E09', from: 'requested', to: 'cancelled', reason: 'seller_silent', by: ['timer'], guard: 'no-answer', clock: 'sellerAnswer', money: 'void', stock: [['held', -1], ['free', 1]] },
  E10: { id: 'E10', from: 'requested', to: 'cancelled', reason: 'buyer_changed_mind', by: ['buyer'], guard: 'not-accepted', clock: null, money: 'void', stock: [['held', -1], ['free', 1]] },
  E11: { id: 'E11', from: 'pledged', to: 'deposit_paid', by: ['timer'], guard: 'pool-met', clock: 'neverScheduled', money: 'price-falls', stock: [['pledged', -1], ['sold', 1]] },
  E12: { id: 'E12', from: 'pledged', to: 'cancelled', reason: 'pool_missed', by: ['timer'], guard: 'pool-missed', clock: 'poolWaive', money: 'refund-deposit', stock: [['pledged', -1], ['free', 1]] },
  E13: { id: 'E13', from: 'pledged', to: 'cancelled', reason: 'left_pool', by: ['buyer'], guard: 'pool-not-frozen', clock: null, money: 'refund-deposit', stock: [['pledged', -1], ['free', 1]] },
  E14: { id: 'E14', from: 'deposit_paid', to: 'scheduled', by: ['both'], guard: 'day-agreed', clock: 'balanceDue', money: 'none', stock: [] },
  E15: { id: 'E15', from: 'deposit_paid', to: 'cancelled', reason: 'buyer_cancelled', by: ['buyer'], guard: null, clock: null, money: 'refund-or-keep', stock: [['sold', -1], ['free', 1]] },
  E16: { id: 'E16', from: 'deposit_paid', to: 'cancelled', reason: 'seller_cancelled', by: ['seller'], guard: 'reason-code', clock: null, money: 'refund-all', stock: [['sold', -1]] },
  E17: { id: 'E17', from: 'deposit_paid', to: 'cancelled', reason: 'never_scheduled', by: ['timer'], guard: 'no-day', clock: 'neverScheduled', money: 'refund-all', stock: [['sold', -1], ['free', 1]] },
  E18: { id: 'E18', from: 'scheduled', to: 'weather_hold', by: ['system', 'seller'], guard: 'outside-limits', clock: 'weatherConsent', money: 'none', stock: [] },
  E19: { id: 'E19', from: 'weather_hold', to: 'scheduled', by: ['buyer', 'timer'], guard: 'new-day', clock: null, money: 'none', stock: [] },
  E20: { id: 'E20', from: 'weather_hold', to: 'cancelled', reason: 'hold_declined', by: ['buyer'], guard: 'before-dispatch', clock: null, money: 'refund-all', stock: [['sold', -1], ['free', 1]] },
  E21: { id: 'E21', from: 'weather_hold', to: 'cancelled', reason: 'hold_no_consent', by: ['timer'], guard: 'no-consent', clock: 'weatherConsent', money: 'refund-all', stock: [['sold', -1], ['free', 1]] },
  E22: { id: 'E22', from: 'scheduled', to: 'ready', by: ['seller'], guard: 'balance-ready', clock: 'pickupGrace', money: 'capture-balance', stock: [] },
  E23: { id: 'E23', from: 'scheduled', to: 'cancelled', reason: 'balance_unpaid', by: ['timer'], guard: 'balance-missing', clock: 'balanceGrace', money: 'keep-deposit', stock: [['sold', -1], ['free', 1]] },
  E24: { id: 'E24', from: 'scheduled', to: 'cancelled', reason: 'buyer_cancelled', by: ['buyer'], guard: null, clock: null, money: 'refund-or-keep', stock: [['sold', -1], ['free', 1]] },
  E25: { id: 'E25', from: 'scheduled', to: 'cancelled', reason: 'seller_cancelled', by: ['seller'], guard: 'reason-code', clock: null, money: 'refund-all', stock: [['sold', -1]] },
  E26: { id: 'E26', from: 'scheduled', to: 'cancelled', reason: 'seller_missed_day', by: ['timer'], guard: 'day-missed', clock: 'missedDay', money: 'refund-all', stock: [['sold', -1]] },
  E27: { id: 'E27', from: 'ready', to: 'weather_hold', by: ['system', 'seller'], guard: 'last-check-red', clock: 'weatherConsent', money: 'none', stock: [] },
  E28: { id: 'E28', from: 'ready', to: 'scheduled', by: ['both'], guard: 'free-move', clock: null, money: 'none', stock: [] },
  E29: { id: 'E29', from: 'ready', to: 'dispatched', by: ['seller'], guard: 'may-dispatch', clock: 'lateBox', money: 'none', stock: [['sold', -1], ['shipped', 1]] },
  E30: { id: 'E30', from: 'ready', to: 'handed_over', by: ['seller'], guard: 'count-agreed', clock: 'claimWindow', money: 'none', stock: [['sold', -1], ['delivered', 1]] },
  E31: { id: 'E31', from: 'ready', to: 'cancelled', reason: 'buyer_no_show', by: ['seller'], guard: 'buyer-absent', clock: 'noShowContest', money: 'refund-balance-keep-deposit', stock: [['sold', -1], ['free', 1]] },
  E32: { id: 'E32', from: 'ready', to: 'cancelled', reason: 'seller_no_show', by: ['buyer'], guard: 'seller-absent', clock: 'noShowContest', money: 'refund-all', stock: [['sold', -1], ['free', 1]] },
  E33: { id: 'E33', from: 'ready', to: 'claim_open', by: ['timer'], guard: 'nobody-marked', clock: 'missedDay', money: 'none', stock: [], claimType: 'handover_unclear' },
  E34: { id: 'E34', from: 'ready', to: 'cancelled', reason: 'seller_missed_day', by: ['timer'], guard: 'day-missed', clock: 'missedDay', money: 'refund-all', stock: [['sold', -1]] },
  E35: { id: 'E35', from: 'dispatched', to: 'arrived', by: ['carrier', 'buyer'], guard: 'delivered', clock: 'claimWindow', money: 'none', stock: [['shipped', -1], ['delivered', 1]] },
  E36: { id: 'E36', from: 'dispatched', to: 'claim_open', by: ['buyer', 'timer'], guard: 'late-or-lost', clock: 'lateBox', money: 'none', stock: [], claimType: 'late_or_lost' },
  E37: { id: 'E37', from: 'arrived', to: 'claim_open', by: ['buyer'], guard: 'loss-shown', clock: 'sellerClaimAnswer', money: 'none', stock: [] },
  E38: { id: 'E38', from: 'arrived', to: 'settled', by: ['buyer', 'timer'], guard: 'all-good', clock: 'claimWindow', money: 'transfer', stock: [] },
  E39: { id: 'E39', from: 'handed_over', to: 'claim_open', by: ['buyer'], guard: 'in-window', clock: 'sellerClaimAnswer', money: 'none', stock: [] },
  E40: { id: 'E40', from: 'handed_over', to: 'settled', by: ['buyer', 'timer'], guard: 'all-good', clock: 'claimWindow', money: 'transfer', stock: [] },
  E41: { id: 'E41', from: 'claim_open', to: 'settled', by: ['seller', 'buyer', 'admin'], guard: 'claim-agreed', clock: 'adminClaimAim', money: 'refund-agreed-transfer', stock: [] },
  E42: { id: 'E42', from: 'claim_open', to: 'settled', by: ['timer'], guard: 'claim-unanswered', clock: 'sellerClaimAnswer', money: 'refund-claimed-transfer', stock: [] },
  E43: { id: 'E43', from: 'requested', to: 'cancelled', reason: 'admin_stop', by: ['admin'], guard: 'admin-cause', clock: null, money: 'void-or-refund-all', stock: [['held', -1]], mayFree: true },
  E44: { id: 'E44', from: 'pledged', to: 'cancelled', reason: 'admin_stop', by: ['admin'], guard: 'admin-cause', clock: null, money: 'void-or-refund-all', stock: [['pledged', -1]], mayFree: true },
  E45: { id: 'E45', from: 'deposit_paid', to: 'cancelled', reason: 'admin_stop', by: ['admin'], guard: 'admin-cause', clock: null, money: 'void-or-refund-all', stock: [['sold', -1]], mayFree: true },
  E46: { id: 'E46', from: 'scheduled', to: 'cancelled', reason: 'admin_stop', by: ['admin'], guard: 'admin-cause', clock: null, money: 'void-or-refund-all', stock: [['sold', -1]], mayFree: true },
  E47: { id: 'E47', from: 'weather_hold', to: 'cancelled', reason: 'admin_stop', by: ['admin'], guard: 'admin-cause', clock: null, money: 'void-or-refund-all', stock: [['sold', -1]], mayFree: true },
  E48: { id: 'E48', from: 'ready', to: 'cancelled', reason: 'admin_stop', by: ['admin'], guard: 'admin-cause', clock: null, money: 'void-or-refund-all', stock: [['sold', -1]], mayFree: true },
  E49: { id: 'E49', from: 'dispatched', to: 'claim_open', by: ['admin'], guard: 'admin-cause-goods-out', clock: null, money: 'none', stock: [], claimType: 'admin' },
  E50: { id: 'E50', from: 'arrived', to: 'claim_open', by: ['admin'], guard: 'admin-cause-goods-out', clock: null, money: 'none', stock: [], claimType: 'admin' },
  E51: { id: 'E51', from: 'handed_over', to: 'claim_open', by: ['admin'], guard: 'admin-cause-goods-out', clock: null, money: 'none', stock: [], claimType: 'admin' },
  E52: { id: 'E52', from: 'pledged', to: 'deposit_paid', by: ['seller'], guard: 'pool-waived', clock: 'neverScheduled', money: 'price-falls', stock: [['pledged', -1], ['sold', 1]] },
  E53: { id: 'E53', from: 'pledged', to: 'cancelled', reason: 'seller_cancelled', by: ['seller'], guard: 'reason-code', clock: null, money: 'refund-deposit', stock: [['pledged', -1]] },
  E54: { id: 'E54', from: 'weather_hold', to: 'cancelled', reason: 'seller_cancelled', by: ['seller'], guard: 'reason-code', clock: null, money: 'refund-all', stock: [['sold', -1]] },
  E55: { id: 'E55', from: 'ready', to: 'cancelled', reason: 'seller_cancelled', by: ['seller'], guard: 'reason-code', clock: null, money: 'refund-all', stock: [['sold', -1]] },
  E56: { id: 'E56', from: 'ready', to: 'cancelled', reason: 'buyer_cancelled', by: ['buyer'], guard: 'before-hand-over', clock: null, money: 'refund-or-keep', stock: [['sold', -1], ['free', 1]] },
} as const satisfies Record<string, Edge>

export type EdgeId = keyof typeof table

/** Every move an order can make. The server, the order path on screen and the model tests read this one table. */
export const edges: Readonly<Record<EdgeId, Edge & { id: EdgeId }>> = table

export const allEdges: readonly (Edge & { id: EdgeId })[] = Object.values(table)
