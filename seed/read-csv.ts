import { readFileSync } from 'node:fs'
import path from 'node:path'
import { fileURLToPath } from 'node:url'

const FOLDER = path.join(path.dirname(fileURLToPath(import.meta.url)), '..', 'assets', 'data')
const CELL = /(?:^|,)(?:"((?:[^"]|"")*)"|([^,]*))/g

function cellsOf(line: string): string[] {
  if (!line.includes('"')) return line.split(',')
  return [...line.matchAll(CELL)].map(([, quoted, plain]) => quoted?.replaceAll('""', '"') ?? plain ?? '')
}

/** Rows of one of our own tables by the names in its head; lines that begin with # are comments. */
export function readCsv<Name extends string>(file: string, names: readonly Name[]): Record<Name, string>[] {
  const lines = readFileSync(path.join(FOLDER, file), 'utf8')
    .split('\n')
    .filter((line) => line !== '' && !line.startsWith('#'))
  const head = cellsOf(lines[0] ?? '')
  const at = names.map((name) => head.indexOf(name))
  if (at.includes(-1)) throw new Error(`${file} has no column ${names[at.indexOf(-1)] ?? ''}`)
  return lines.slice(1).map((line) => {
    const cells = cellsOf(line)
    const row = names.map((name, n) => [name, cells[at[n] ?? 0] ?? ''] as const)
    return Object.fromEntries(row) as Record<Name, string>
  })
}
