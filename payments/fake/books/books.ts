import { Draft, stage } from './draft'
import { Journal } from './journal'
import { emptyTables, tableNames, type Change, type Tables } from './tables'

const COMPACT_EVERY_LINES = 5000

/** The practice processor's own books: in memory for reading, on disk before anything is answered. */
export class Books {
  private readonly tables: Tables = emptyTables()
  private readonly journal: Journal
  private readonly listeners: ((changes: readonly Change[]) => void)[] = []
  private linesSinceCompact = 0

  constructor(folder: string) {
    this.journal = new Journal(folder)
    this.journal.open((changes) => this.apply(changes))
    this.compact()
  }

  draft(): Draft {
    return new Draft(this.tables)
  }

  commit(draft: Draft): void {
    const changes = draft.changes()
    if (changes.length === 0) return
    this.journal.append(changes)
    this.apply(changes)
    this.linesSinceCompact += 1
    if (this.linesSinceCompact >= COMPACT_EVERY_LINES) this.compact()
    for (const listener of this.listeners) listener(changes)
  }

  /** One short act of its own: read, write, commit. */
  write<R>(act: (draft: Draft) => R): R {
    const draft = this.draft()
    const result = act(draft)
    this.commit(draft)
    return result
  }

  onCommit(listener: (changes: readonly Change[]) => void): void {
    this.listeners.push(listener)
  }

  /** An idempotency key lives a day (processor's documentation on idempotent requests, from memory). */
  forgetReplies(keptBeforeMs: number): void {
    for (const [id, reply] of this.tables.replies)
      if (reply.keptAtMs < keptBeforeMs) this.tables.replies.delete(id)
  }

  close(): void {
    this.journal.close()
  }

  private apply(changes: readonly Change[]): void {
    for (const change of changes) stage(this.tables, change)
  }

  private compact(): void {
    const rows = tableNames.flatMap((table) => {
      const kept: Iterable<{ id: string }> = this.tables[table].values()
      return Array.from(kept, (row) => ({ table, row }))
    })
    this.journal.compact(rows)
    this.linesSinceCompact = 0
  }
}
