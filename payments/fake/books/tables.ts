import type { EventRow } from '../webhooks/event-row'
import type {
  AccountLinkRow,
  AccountRow,
  BalanceTransactionRow,
  ChargeRow,
  DeliveryRow,
  DisputeRow,
  PaymentRow,
  RefundRow,
  ReplyRow,
  ReversalRow,
  SessionRow,
  TransferRow,
} from './rows'

export interface RowOf {
  accountLinks: AccountLinkRow
  accounts: AccountRow
  balanceTransactions: BalanceTransactionRow
  charges: ChargeRow
  deliveries: DeliveryRow
  disputes: DisputeRow
  events: EventRow
  payments: PaymentRow
  refunds: RefundRow
  replies: ReplyRow
  reversals: ReversalRow
  sessions: SessionRow
  transfers: TransferRow
}

export type TableName = keyof RowOf

export type Tables = { [T in TableName]: Map<string, RowOf[T]> }

/** One row written: what a line of the journal is made of. */
export type Change = { [T in TableName]: { table: T; row: RowOf[T] } }[TableName]

export const tableNames = [
  'accountLinks',
  'accounts',
  'balanceTransactions',
  'charges',
  'deliveries',
  'disputes',
  'events',
  'payments',
  'refunds',
  'replies',
  'reversals',
  'sessions',
  'transfers',
] as const satisfies readonly TableName[]

export function emptyTables(): Tables {
  return {
    accountLinks: new Map(),
    accounts: new Map(),
    balanceTransactions: new Map(),
    charges: new Map(),
    deliveries: new Map(),
    disputes: new Map(),
    events: new Map(),
    payments: new Map(),
    refunds: new Map(),
    replies: new Map(),
    reversals: new Map(),
    sessions: new Map(),
    transfers: new Map(),
  }
}
