import { emptyTables, type Change, type RowOf, type TableName, type Tables } from './tables'

/** Changes not yet written: all of them reach the books in one line, or none does. */
export class Draft {
  private readonly staged: Tables = emptyTables()
  private readonly written: Change[] = []

  constructor(private readonly base: Tables) {}

  get<T extends TableName>(table: T, id: string): RowOf[T] | undefined {
    return this.staged[table].get(id) ?? this.base[table].get(id)
  }

  put(change: Change): void {
    stage(this.staged, change)
    this.written.push(change)
  }

  /** Oldest first. */
  all<T extends TableName>(table: T): RowOf[T][] {
    const staged = this.staged[table]
    const kept = Array.from(this.base[table], ([id, row]) => staged.get(id) ?? row)
    for (const [id, row] of staged) if (!this.base[table].has(id)) kept.push(row)
    return kept
  }

  changes(): readonly Change[] {
    return this.written
  }
}

export function stage(tables: Tables, change: Change): void {
  const put = <T extends TableName>(table: T, row: RowOf[T]) => tables[table].set(row.id, row)
  put(change.table, change.row)
}
