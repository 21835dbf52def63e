import { describeError } from '@/server/describe-error'
import { log } from '@/server/log'
import { failPoint } from '@/server/outbox/fail-point'
import {
  claimEffects,
  giveUpEffect,
  renewClaims,
  retryEffect,
  type Effect,
  type EffectKind,
} from '@/server/outbox/outbox-store'

/** Does one effect and marks its row done in the transaction that books the outcome. Throws to be tried again. */
export type Doer = (effect: Effect) => Promise<void>

/** Thrown by a doer when trying again cannot help. */
export class GiveUp extends Error {}

const MOST_TRIES = 60
const RENEW_EVERY_MS = 2_000
const LONGEST_WAIT_MS = 60 * 60_000

const doers = new Map<EffectKind, Doer>()

export function registerDoer(kind: EffectKind, doer: Doer): void {
  doers.set(kind, doer)
}

/** 2 s, 4 s, 8 s … up to an hour: sixty tries last more than a day. */
function waitMs(attempts: number): number {
  return Math.min(LONGEST_WAIT_MS, 1000 * 2 ** Math.min(attempts, 12))
}

async function runOne(effect: Effect): Promise<void> {
  const doer = doers.get(effect.kind)
  if (!doer) throw new Error(`nobody does ${effect.kind}`)
  failPoint(`${effect.kind}:claimed`)
  try {
    await doer(effect)
    failPoint(`${effect.kind}:done`)
  } catch (error) {
    const told = describeError(error).message
    log.warn({ seq: effect.seq, kind: effect.kind, attempts: effect.attempts, told }, 'effect failed')
    if (error instanceof GiveUp || effect.attempts >= MOST_TRIES) await giveUpEffect(effect.seq, told)
    else await retryEffect(effect.seq, waitMs(effect.attempts), told)
  }
}

/** Does claimed effects one after the other; those that still wait their turn stay claimed meanwhile. */
async function runClaimed(effects: Effect[]): Promise<void> {
  const waiting = new Set(effects.map((effect) => effect.seq))
  const renewal = setInterval(() => {
    // A renewal that fails only lets another worker take over; the key keeps the effect single.
    renewClaims([...waiting]).catch((error: unknown) => log.warn({ err: error }, 'claims not renewed'))
  }, RENEW_EVERY_MS)
  try {
    for (const effect of effects) {
      await runOne(effect)
      waiting.delete(effect.seq)
    }
  } finally {
    clearInterval(renewal)
  }
}

/** Runs what is due, oldest first, until nothing is; returns how many were tried. */
export async function runEffects(): Promise<number> {
  let tried = 0
  for (;;) {
    const effects = await claimEffects(8)
    if (effects.length === 0) return tried
    await runClaimed(effects)
    tried += effects.length
  }
}

/** Runs one effect right after its commit, so that the person who caused it sees the outcome; errors stay queued. */
export async function runEffectNow(seq: number): Promise<void> {
  await runClaimed(await claimEffects(1, { seq }))
}
