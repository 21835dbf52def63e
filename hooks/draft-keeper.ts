import { NoAnswer } from '@/shared/api/call'
import { Problem } from '@/shared/api/problem'
import type { ListingDraft } from '@/shared/contracts/listings'

export type DraftState =
  | { kind: 'quiet' }
  | { kind: 'typing' }
  | { kind: 'saving' }
  | { kind: 'saved'; at: string }
  /** No connection, or the server is too busy: kept here, sent again later. */
  | { kind: 'on-device' }
  /** A newer draft exists elsewhere: both are kept until the seller chooses. */
  | { kind: 'stale' }
  | { kind: 'refused'; message: string }

export interface DraftPorts {
  send: (draft: ListingDraft, revision: number) => Promise<{ draftRevision: number; savedAt: string }>
  keep: (draft: ListingDraft, baseRevision: number) => void
  forget: () => void
  pauseMs: number
  retryMs: number
}

/** Saves what is typed by itself: one request at a time, the newest words last, nothing thrown away on a failure. */
export class DraftKeeper {
  private waiting: ListingDraft | null = null
  private running: Promise<void> | null = null
  private timer: ReturnType<typeof setTimeout> | undefined
  private state: DraftState = { kind: 'quiet' }
  private readonly listeners = new Set<() => void>()

  constructor(
    private revision: number,
    private readonly ports: DraftPorts,
  ) {}

  readState = () => this.state
  readRevision = () => this.revision

  listen = (tell: () => void) => {
    this.listeners.add(tell)
    return () => {
      this.listeners.delete(tell)
    }
  }

  /** The form changed: kept on the device at once, sent when the typing pauses. */
  type(draft: ListingDraft) {
    this.waiting = draft
    this.ports.keep(draft, this.revision)
    if (this.state.kind === 'stale') return
    if (!this.running) this.show({ kind: 'typing' })
    this.sendIn(this.ports.pauseMs)
  }

  /** Sends now what waits. Resolves when everything typed is on the server; throws what stopped it. */
  async flush(): Promise<number> {
    clearTimeout(this.timer)
    await this.running
    if (this.waiting) await this.sendWaiting()
    if (this.waiting) throw this.lastError ?? new NoAnswer()
    return this.revision
  }

  /** Somebody meant the draft of this revision to be the one to go on from. */
  adopt(revision: number) {
    this.revision = revision
    this.waiting = null
    this.ports.forget()
    this.show({ kind: 'quiet' })
  }

  /** A kept draft was typed on top of an older revision than the server now holds. */
  markStale() {
    this.show({ kind: 'stale' })
  }

  retry = () => {
    if (this.waiting && this.state.kind !== 'stale') void this.sendWaiting()
  }

  /** The form closes: what waits is sent without a pause. */
  rest = () => {
    clearTimeout(this.timer)
    this.retry()
  }

  private lastError: unknown = null

  private sendIn(afterMs: number) {
    clearTimeout(this.timer)
    this.timer = setTimeout(this.retry, afterMs)
  }

  private sendWaiting(): Promise<void> {
    this.running ??= this.sendOnce().finally(() => {
      this.running = null
    })
    return this.running
  }

  private async sendOnce() {
    while (this.waiting) {
      const draft = this.waiting
      this.show({ kind: 'saving' })
      try {
        const saved = await this.ports.send(draft, this.revision)
        this.revision = saved.draftRevision
        if (this.waiting === draft) {
          this.waiting = null
          this.ports.forget()
          this.show({ kind: 'saved', at: saved.savedAt })
        } else this.ports.keep(this.waiting, this.revision)
      } catch (error) {
        this.stopped(error)
        return
      }
    }
  }

  private stopped(error: unknown) {
    this.lastError = error
    if (error instanceof Problem && error.slug === 'version-stale') return this.show({ kind: 'stale' })
    const mayPass =
      error instanceof NoAnswer || (error instanceof Problem && (error.status >= 500 || error.status === 429))
    if (!mayPass) return this.show({ kind: 'refused', message: refusal(error) })
    this.show({ kind: 'on-device' })
    this.sendIn(this.ports.retryMs)
  }

  private show(state: DraftState) {
    this.state = state
    for (const tell of this.listeners) tell()
  }
}

function refusal(error: unknown): string {
  if (error instanceof Problem && error.slug === 'not-signed-in')
    return 'You were signed out. Sign in again to save it.'
  return error instanceof Problem ? error.message : 'Something broke on our side.'
}
