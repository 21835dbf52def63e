import { z } from 'zod'

import { endpoint } from '@/shared/api/endpoint'
import { cents, dayText, publicIdText } from '@/shared/contracts/values'

const monthText = z.string().regex(/^\d{4}-(0[1-9]|1[0-2])$/, 'A month such as 2027-05, please.')

export const statementRow = z.object({
  orderId: publicIdText,
  /** The day the money was released, by the farm's calendar. */
  day: dayText,
  title: z.string(),
  /** `kept`: the buyer did not come or cancelled late, and part of the deposit stays. */
  kind: z.enum(['complete', 'kept']),
  quantity: z.int(),
  /** What the buyer paid in all, before anything went back. */
  paidCents: cents,
  refundedCents: cents,
  taxCents: cents,
  feeCents: cents,
  yoursCents: cents,
})
export type StatementRow = z.output<typeof statementRow>

export const statement = z.object({
  month: monthText,
  zone: z.string(),
  rows: z.array(statementRow),
  total: statementRow.pick({
    paidCents: true,
    refundedCents: true,
    taxCents: true,
    feeCents: true,
    yoursCents: true,
  }),
})
export type Statement = z.output<typeof statement>

export const readStatement = endpoint({
  method: 'GET',
  path: '/statements/:month',
  auth: 'seller',
  summary: 'Every order whose money was released in a month, and where each cent went',
  params: z.object({ month: monthText }),
  reply: statement,
})

export const printStatement = endpoint({
  method: 'GET',
  path: '/statements/:month/csv',
  auth: 'seller',
  summary: 'The same as a table for a spreadsheet',
  params: z.object({ month: monthText }),
  reply: z.instanceof(Uint8Array),
  replyMedia: 'text/csv',
})

const soldOfMonth = z.object({
  month: monthText,
  /** Of each kind what was released in the month, the most valuable first. */
  kinds: z.array(z.object({ name: z.string(), quantity: z.int(), goodsCents: cents })),
})

export const sellerRecord = z.object({
  /** The last twelve months, the oldest first; a month without sales has no kinds. */
  months: z.array(soldOfMonth),
  inform: z.object({
    /** The fullest twelve months of the last twenty-four. */
    sales: z.int(),
    grossCents: cents,
    isOver: z.boolean(),
    /** By when details have to be given and checked; absent while below the line. */
    dueOn: dayText.optional(),
  }),
})
export type SellerRecord = z.output<typeof sellerRecord>

export const readRecord = endpoint({
  method: 'GET',
  path: '/record',
  auth: 'seller',
  summary: 'What was sold month by month, and how near the lines of the INFORM Consumers Act are',
  reply: sellerRecord,
})
