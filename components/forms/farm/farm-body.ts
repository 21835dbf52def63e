import { openFarm } from '@/shared/contracts/sellers'
import type { z } from 'zod'

import type { FarmTyping } from './farm-typing'

/** The form as the call wants it: what is not answered is left out, and a number only goes with a licence. */
export function farmBody(typing: FarmTyping): Record<string, unknown> {
  const licences = typing.licences.map(({ state, answer, number }) => ({
    state,
    ...(answer ? { answer } : {}),
    ...(answer === 'have' && number.trim() ? { number } : {}),
  }))
  const answered = Object.entries(typing).filter(([field, text]) => field === 'about' || text !== '')
  return { ...Object.fromEntries(answered), licences }
}

export function farmIssues(typing: FarmTyping): readonly z.core.$ZodIssue[] {
  const read = openFarm.body?.safeParse(farmBody(typing), { reportInput: true })
  return read?.error?.issues ?? []
}
