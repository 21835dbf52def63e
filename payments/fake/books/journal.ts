import {
  closeSync,
  existsSync,
  fsyncSync,
  mkdirSync,
  openSync,
  readFileSync,
  renameSync,
  truncateSync,
  writeFileSync,
} from 'node:fs'
import { join } from 'node:path'
import type { Change, TableName } from './tables'

interface Line {
  line: number
  changes: readonly Change[]
}

/**
 * `snapshot.json` + `journal.jsonl`. A change is one write of one line before the answer leaves, so a killed process
 * keeps all of it or nothing: a torn last line is cut off at the next start.
 */
export class Journal {
  private readonly snapshotPath: string
  private readonly journalPath: string
  private file: number | null = null
  private lastLine = 0

  constructor(folder: string) {
    mkdirSync(folder, { recursive: true })
    this.snapshotPath = join(folder, 'snapshot.json')
    this.journalPath = join(folder, 'journal.jsonl')
  }

  /** Hands over every change ever kept, oldest first, and opens the journal for writing. */
  open(apply: (changes: readonly Change[]) => void): void {
    const snapshot = this.readSnapshot()
    if (snapshot) {
      apply(snapshot.changes)
      this.lastLine = snapshot.line
    }
    for (const line of this.readLines()) {
      // Lines the snapshot already holds: the process was killed between writing it and emptying the journal.
      if (line.line <= this.lastLine) continue
      apply(line.changes)
      this.lastLine = line.line
    }
    this.file = openSync(this.journalPath, 'a')
  }

  append(changes: readonly Change[]): void {
    if (this.file === null) throw new Error('the books are closed')
    this.lastLine += 1
    const line: Line = { line: this.lastLine, changes }
    writeFileSync(this.file, `${JSON.stringify(line)}\n`)
  }

  /** Replaces the snapshot in one step (write aside, rename) and empties the journal. */
  compact(rows: readonly { table: TableName; row: { id: string } }[]): void {
    const aside = `${this.snapshotPath}.new`
    const file = openSync(aside, 'w')
    writeFileSync(file, JSON.stringify({ line: this.lastLine, changes: rows }))
    fsyncSync(file)
    closeSync(file)
    renameSync(aside, this.snapshotPath)
    truncateSync(this.journalPath, 0)
  }

  close(): void {
    if (this.file !== null) closeSync(this.file)
    this.file = null
  }

  private readSnapshot(): Line | null {
    if (!existsSync(this.snapshotPath)) return null
    const snapshot: Line = JSON.parse(readFileSync(this.snapshotPath, 'utf8'))
    return snapshot
  }

  private readLines(): Line[] {
    if (!existsSync(this.journalPath)) return []
    const text = readFileSync(this.journalPath, 'utf8')
    const end = text.lastIndexOf('\n') + 1
    if (end < text.length) truncateSync(this.journalPath, Buffer.byteLength(text.slice(0, end)))
    return text
      .slice(0, end)
      .split('\n')
      .filter(Boolean)
      .map((line): Line => JSON.parse(line))
  }
}
