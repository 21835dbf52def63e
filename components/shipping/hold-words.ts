import { dayWords } from './ship-day-words'

import type { ShownHold } from '@/shared/contracts/shipments'
import { printMoment, printSlot } from '@/shared/times/print-time'

/** The day that was proposed, in words; null: none yet. */
export function proposedWords({ proposed }: Pick<ShownHold, 'proposed'>, zone: string): string | null {
  if (!proposed) return null
  return proposed.shipDay
    ? `to leave on ${dayWords(proposed.shipDay)}`
    : printSlot({ startsAt: proposed.startsAt, endsAt: proposed.endsAt, zone })
}

interface Silence {
  silenceMoves: boolean
  /** When silence counts; null: nobody says. */
  until: string | null
  zone: string
  isBuyer: boolean
}

/** What happens if the buyer says nothing (16 CFR 435.2(b)). */
export function silenceWords({ silenceMoves, until, zone, isBuyer }: Silence): string {
  const who = isBuyer ? 'you say' : 'the buyer says'
  const when = until === null ? '' : ` until ${printMoment(until, zone)}`
  return silenceMoves
    ? `If ${who} nothing${when}, the new day stands.`
    : `If ${who} nothing${when}, the order ends and everything paid goes back.`
}

export function startedWords({ startedBy }: Pick<ShownHold, 'startedBy'>, isSeller: boolean): string {
  if (startedBy === 'system') return 'We looked at the weather of the way and stopped it.'
  return isSeller ? 'You held it for weather.' : 'The seller held it for weather.'
}

const LEAST_LETTERS = 5

export const isWhyShort = (why: string) => why.trim().length < LEAST_LETTERS
