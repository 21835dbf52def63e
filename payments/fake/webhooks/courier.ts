import type { DeliveryRow } from '../books/rows'
import type { Change } from '../books/tables'
import { presentEvent } from '../objects/event'
import { openTurn, type World } from '../turn'
import { signatureHeader } from './sign'

const MOST_ATTEMPTS = 16
const LONGEST_GAP_MS = 10 * 60_000
const AT_ONCE = 8
const ANSWER_WITHIN_MS = 10_000

/** 1 s, 2 s, 4 s … 10 min, with the first gap given: about two hours in all before a webhook is given up. */
export function gapMs(firstGapMs: number, attempts: number): number {
  return Math.min(firstGapMs * 2 ** Math.max(0, attempts - 1), LONGEST_GAP_MS)
}

/** Sends events to the platform until each is answered 2xx. What is unanswered survives a restart. */
export class Courier {
  private readonly queue: string[] = []
  private readonly timers = new Map<string, NodeJS.Timeout>()
  private readonly stopper = new AbortController()
  private sending = 0
  private isHeld = false
  private toDuplicate = 0
  private toLose = 0

  constructor(private readonly world: World) {
    world.books.onCommit((changes) => this.collect(changes))
  }

  /** Everything a former run left unacknowledged goes out again. */
  start(): void {
    for (const row of this.world.books.draft().all('deliveries'))
      if (row.state === 'waiting') this.queue.push(row.id)
    this.pump()
  }

  hold(isHeld: boolean): void {
    this.isHeld = isHeld
    this.pump()
  }

  /** The next `count` webhooks go out twice. */
  duplicateNext(count: number): void {
    this.toDuplicate = count
  }

  /** The next `count` sendings get lost on the way; they are tried again like any other. */
  loseNext(count: number): void {
    this.toLose = count
  }

  resend(eventId: string): void {
    this.queue.push(eventId)
    this.pump()
  }

  stop(): void {
    this.stopper.abort()
    for (const timer of this.timers.values()) clearTimeout(timer)
    this.timers.clear()
  }

  private collect(changes: readonly Change[]): void {
    for (const change of changes) {
      if (change.table === 'deliveries' && change.row.state === 'waiting' && change.row.attempts === 0) {
        this.queue.push(change.row.id)
      }
    }
    // After the act has been answered, or at least not in the middle of it.
    setImmediate(() => this.pump())
  }

  private pump(): void {
    while (!this.isHeld && !this.stopper.signal.aborted && this.sending < AT_ONCE) {
      const id = this.queue.shift()
      if (id === undefined) return
      this.sending += 1
      void this.deliver(id).finally(() => {
        this.sending -= 1
        this.pump()
      })
    }
  }

  private async deliver(id: string): Promise<void> {
    const isTwice = this.toDuplicate > 0
    if (isTwice) this.toDuplicate -= 1
    const isAnswered = await this.send(id)
    if (isTwice) await this.send(id)
    if (this.stopper.signal.aborted) return
    const row = this.world.books.draft().get('deliveries', id)
    if (row && row.state !== 'acknowledged') this.note(row, isAnswered)
  }

  private note(row: DeliveryRow, isAnswered: boolean): void {
    const attempts = row.attempts + 1
    const state = isAnswered ? 'acknowledged' : attempts >= MOST_ATTEMPTS ? 'abandoned' : 'waiting'
    this.world.books.write((draft) =>
      draft.put({ table: 'deliveries', row: { id: row.id, state, attempts } }),
    )
    if (state !== 'waiting') return
    const again = setTimeout(
      () => {
        this.timers.delete(row.id)
        this.resend(row.id)
      },
      gapMs(this.world.settings.webhookFirstGapMs, attempts),
    )
    this.timers.set(row.id, again)
  }

  private async send(id: string): Promise<boolean> {
    const { webhookUrl, webhookSecret } = this.world.settings
    const turn = openTurn(this.world)
    const event = turn.draft.get('events', id)
    if (!event || webhookUrl === null) return false
    if (this.toLose > 0) {
      this.toLose -= 1
      return false
    }
    const body = JSON.stringify(presentEvent(turn, event))
    const signature = signatureHeader(body, webhookSecret, Math.floor(Date.now() / 1000))
    try {
      const response = await fetch(webhookUrl, {
        method: 'POST',
        redirect: 'manual',
        headers: { 'content-type': 'application/json; charset=utf-8', 'stripe-signature': signature },
        body,
        signal: AbortSignal.any([this.stopper.signal, AbortSignal.timeout(ANSWER_WITHIN_MS)]),
      })
      await response.arrayBuffer()
      return response.ok
    } catch {
      return false
    }
  }
}
