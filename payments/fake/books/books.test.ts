import { appendFileSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { Books } from './books'

let folder: string
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'payments-fake-'))
})
afterEach(() => rmSync(folder, { recursive: true, force: true }))

function note(books: Books, id: string): void {
  books.write((draft) => draft.put({ table: 'deliveries', row: { id, state: 'waiting', attempts: 0 } }))
}

function idsIn(books: Books): string[] {
  return books
    .draft()
    .all('deliveries')
    .map((row) => row.id)
}

describe('the books', () => {
  it('are read back as they were written, newest state last', () => {
    const books = new Books(folder)
    note(books, 'evt_1')
    note(books, 'evt_2')
    books.write((draft) =>
      draft.put({ table: 'deliveries', row: { id: 'evt_1', state: 'acknowledged', attempts: 1 } }),
    )
    books.close()
    const again = new Books(folder)
    expect(idsIn(again)).toEqual(['evt_1', 'evt_2'])
    expect(again.draft().get('deliveries', 'evt_1')?.state).toBe('acknowledged')
    again.close()
  })

  it('cut off a line that was never finished and go on behind it', () => {
    const books = new Books(folder)
    note(books, 'evt_1')
    books.close()
    appendFileSync(join(folder, 'journal.jsonl'), '{"line":2,"changes":[{"tab')
    const again = new Books(folder)
    note(again, 'evt_2')
    again.close()
    const third = new Books(folder)
    expect(idsIn(third)).toEqual(['evt_1', 'evt_2'])
    third.close()
  })

  it('apply nothing twice when killed between snapshot and emptied journal', () => {
    const books = new Books(folder)
    note(books, 'evt_1')
    books.write((draft) =>
      draft.put({ table: 'deliveries', row: { id: 'evt_1', state: 'acknowledged', attempts: 1 } }),
    )
    books.close()
    const journal = readFileSync(join(folder, 'journal.jsonl'))
    new Books(folder).close()
    writeFileSync(join(folder, 'journal.jsonl'), journal)
    const again = new Books(folder)
    expect(again.draft().get('deliveries', 'evt_1')?.attempts).toBe(1)
    again.close()
  })

  it('show a draft to itself only, until it is committed', () => {
    const books = new Books(folder)
    const draft = books.draft()
    draft.put({ table: 'deliveries', row: { id: 'evt_1', state: 'waiting', attempts: 0 } })
    expect(draft.all('deliveries')).toHaveLength(1)
    expect(idsIn(books)).toEqual([])
    books.commit(draft)
    expect(idsIn(books)).toEqual(['evt_1'])
    books.close()
  })
})
