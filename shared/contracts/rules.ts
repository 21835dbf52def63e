import { z } from 'zod'

import { dayText, stateCode } from '@/shared/contracts/values'

export const ruleReason = z.object({
  ruleKey: z.string(),
  version: z.int(),
  jurisdiction: z.string(),
  activity: z.string(),
  status: z.string(),
  sourceTitle: z.string(),
  sourceUrl: z.string().optional(),
  sourceDate: z.string(),
  checkedOn: dayText,
  confidence: z.string(),
  overdue: z.boolean(),
  /** Secondary text or hearsay: shown beside the verdict, without weight in it. */
  hint: z.boolean(),
})

/** What the legal gate says to one buyer about one listing, in words and with its sources. */
export const gateVerdict = z.object({
  status: z.enum([
    'allowed',
    'allowed_with_conditions',
    'permit_buyer',
    'permit_seller',
    'permit_both',
    'unknown',
    'prohibited',
  ]),
  buy: z.enum(['yes', 'ticks', 'reserve-only', 'explicit-unknown', 'ask-moderators', 'no']),
  crossesStateLine: z.boolean(),
  buyerState: stateCode,
  reasons: z.array(ruleReason),
  ticks: z.array(z.object({ id: z.string(), text: z.string() })),
  cautions: z.array(z.object({ id: z.string(), text: z.string() })),
  papersNeeded: z.array(z.string()),
  demonstration: z.boolean(),
})
export type GateVerdict = z.output<typeof gateVerdict>

/** Kept with the order: the verdict as shown, and which statements were ticked. */
export interface RuleEvidence {
  verdict: GateVerdict
  ticked: string[]
}
