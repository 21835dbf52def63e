import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'

import { DraftKeeper, type DraftPorts } from '@/hooks/draft-keeper'
import { NoAnswer } from '@/shared/api/call'
import { Problem } from '@/shared/api/problem'
import type { ListingDraft } from '@/shared/contracts/listings'

const savedAt = '2027-01-15T17:04:00.000Z'
let kept: { draft: ListingDraft; baseRevision: number } | null
let sent: { draft: ListingDraft; revision: number }[]
let answer: (draft: ListingDraft, revision: number) => Promise<{ draftRevision: number; savedAt: string }>

const ports: DraftPorts = {
  send: (draft, revision) => {
    sent.push({ draft, revision })
    return answer(draft, revision)
  },
  keep: (draft, baseRevision) => {
    kept = { draft, baseRevision }
  },
  forget: () => {
    kept = null
  },
  pauseMs: 1000,
  retryMs: 5000,
}

const accept: typeof answer = async (_draft, revision) => ({ draftRevision: revision + 1, savedAt })
const refuse =
  (error: Error): typeof answer =>
  async () => {
    throw error
  }

beforeEach(() => {
  vi.useFakeTimers()
  kept = null
  sent = []
  answer = accept
})
afterEach(() => {
  vi.useRealTimers()
})

describe('keeping a draft', () => {
  it('sends the newest words once, when the typing pauses', async () => {
    const keeper = new DraftKeeper(4, ports)
    keeper.type({ strain: 'A' })
    keeper.type({ strain: 'AB' })
    expect(keeper.readState()).toEqual({ kind: 'typing' })
    await vi.advanceTimersByTimeAsync(1000)
    expect(sent).toEqual([{ draft: { strain: 'AB' }, revision: 4 }])
    expect(keeper.readState()).toEqual({ kind: 'saved', at: savedAt })
    expect(keeper.readRevision()).toBe(5)
    expect(kept).toBeNull()
  })

  it('sends what was typed during a save afterwards, on top of the new revision', async () => {
    let release = () => undefined as void
    answer = (draft, revision) =>
      new Promise((resolve) => {
        release = () => resolve({ draftRevision: revision + 1, savedAt })
        if (draft.strain === 'second') release()
      })
    const keeper = new DraftKeeper(1, ports)
    keeper.type({ strain: 'first' })
    await vi.advanceTimersByTimeAsync(1000)
    keeper.type({ strain: 'second' })
    release()
    await vi.advanceTimersByTimeAsync(0)
    expect(sent.map((one) => one.revision)).toEqual([1, 2])
    expect(keeper.readState().kind).toBe('saved')
  })

  it('keeps the words on the device without a connection and sends them later', async () => {
    answer = refuse(new NoAnswer())
    const keeper = new DraftKeeper(1, ports)
    keeper.type({ strain: 'offline' })
    await vi.advanceTimersByTimeAsync(1000)
    expect(keeper.readState()).toEqual({ kind: 'on-device' })
    expect(kept).toEqual({ draft: { strain: 'offline' }, baseRevision: 1 })
    answer = accept
    await vi.advanceTimersByTimeAsync(5000)
    expect(keeper.readState().kind).toBe('saved')
    expect(kept).toBeNull()
  })

  it('never overwrites a newer draft, and sends nothing more until the seller has chosen', async () => {
    answer = refuse(new Problem('version-stale'))
    const keeper = new DraftKeeper(1, ports)
    keeper.type({ strain: 'mine' })
    await vi.advanceTimersByTimeAsync(1000)
    expect(keeper.readState()).toEqual({ kind: 'stale' })
    keeper.type({ strain: 'mine too' })
    await vi.advanceTimersByTimeAsync(60_000)
    expect(sent).toHaveLength(1)
    expect(kept).toEqual({ draft: { strain: 'mine too' }, baseRevision: 1 })
  })

  it('goes on from the revision the seller adopted', async () => {
    answer = refuse(new Problem('version-stale'))
    const keeper = new DraftKeeper(1, ports)
    keeper.type({ strain: 'mine' })
    await vi.advanceTimersByTimeAsync(1000)
    answer = accept
    keeper.adopt(7)
    keeper.type({ strain: 'mine' })
    await vi.advanceTimersByTimeAsync(1000)
    expect(sent.at(-1)).toEqual({ draft: { strain: 'mine' }, revision: 7 })
    expect(keeper.readRevision()).toBe(8)
  })

  it('says why the server refuses for good', async () => {
    answer = refuse(new Problem('not-allowed', 'Your account is on hold.'))
    const keeper = new DraftKeeper(1, ports)
    keeper.type({ strain: 'x' })
    await vi.advanceTimersByTimeAsync(1000)
    expect(keeper.readState()).toEqual({ kind: 'refused', message: 'Your account is on hold.' })
    expect(kept).not.toBeNull()
  })
})

describe('flushing before publishing', () => {
  it('answers with the revision that holds every word', async () => {
    const keeper = new DraftKeeper(2, ports)
    keeper.type({ strain: 'x' })
    await expect(keeper.flush()).resolves.toBe(3)
    expect(sent).toHaveLength(1)
  })

  it('throws what stopped it', async () => {
    answer = refuse(new Problem('version-stale'))
    const keeper = new DraftKeeper(2, ports)
    keeper.type({ strain: 'x' })
    await expect(keeper.flush()).rejects.toThrow('It was changed meanwhile')
  })

  it('sends nothing when nothing was typed', async () => {
    await expect(new DraftKeeper(2, ports).flush()).resolves.toBe(2)
    expect(sent).toEqual([])
  })
})
