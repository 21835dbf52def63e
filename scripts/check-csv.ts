// `npm run check:csv`: tables for spreadsheets (SEC-6). `--cases n`: other than 10,000 cells; `--plant-fault`: must be noticed.
import { parseArgs } from 'node:util'

import * as fc from 'fast-check'
import Papa from 'papaparse'

import { writeReport } from './write-report.mjs'

import { writeCsv } from '@/server/statements/write-csv'

const SEED = 4180
const CELLS_A_ROW = 4
const { values } = parseArgs({
  options: {
    cases: { type: 'string', default: '10000' },
    'plant-fault': { type: 'boolean', default: false },
  },
})
const rows = Math.ceil(Number(values.cases) / CELLS_A_ROW)
const isSpoiled = values['plant-fault']

/** What a spreadsheet takes for the beginning of a formula, in ASCII and in the full-width forms. */
const begins = ['=', '+', '-', '@', '\t', '\r', '＝', '＋', '－', '＠']
const nasty = fc.constantFrom(
  ...[
    '=1+1',
    '=HYPERLINK("http://x.example","x")',
    '+1',
    '-1',
    '@SUM(A1)',
    '\t=1',
    '\r=1',
    '＝1',
    '"=1"',
    ';=1',
  ],
  ...['a\r\nb', 'a\nb', '"', '""', ',', "'=1", ' =1', '', '\u0000', '\ufeff=1', 'x'.repeat(5000)],
)
const words = fc.oneof(nasty, fc.string({ unit: 'grapheme', maxLength: 40 }), fc.string({ maxLength: 40 }))
const row = fc.record({
  text: words,
  number: fc.double({ noNaN: true, noDefaultInfinity: true }),
  other: words,
  count: fc.integer(),
})

const columns = [
  { key: 'text', header: 'Text' },
  { key: 'number', header: '=Number' },
  { key: 'other', header: 'Other' },
  { key: 'count', header: 'Count' },
] as const

const isFormula = (cell: string) => begins.some((begin) => cell.startsWith(begin))
const isNumber = (cell: string) => cell !== '' && Number.isFinite(Number(cell))

/** What is wrong with one table, read back by a reader that others wrote. */
function faultsOf(made: { text: string; number: number; other: string; count: number }[]): string[] {
  const bytes = writeCsv(made, columns)
  const written = new TextDecoder('utf-8', { ignoreBOM: true }).decode(bytes)
  const text = isSpoiled ? written.replaceAll("'=", '=') : written
  const { data, errors } = Papa.parse<string[]>(text.replace(/^\ufeff/, ''))
  const [header, ...body] = data.filter(
    (line, at) => at < made.length + 1 || line.some((cell) => cell !== ''),
  )
  const faults = errors.filter(({ type }) => type !== 'Delimiter').map(({ message }) => message)
  if (!text.startsWith('\ufeff')) faults.push('no byte order mark')
  if (body.length !== made.length) faults.push(`${body.length} rows of ${made.length}`)
  if (header?.some(isFormula)) faults.push('a header begins a formula')
  body.forEach((cells, at) => {
    const wanted = made[at]
    if (!wanted) return
    for (const [key, cell] of [
      ['text', cells[0]],
      ['other', cells[2]],
    ] as const) {
      const said = wanted[key]
      if (cell === undefined) faults.push(`${key} is missing`)
      else if (isFormula(cell)) faults.push(`${JSON.stringify(cell.slice(0, 20))} begins a formula`)
      else if (cell !== said && cell !== `'${said}`)
        faults.push(`${JSON.stringify(said.slice(0, 20))} came back changed`)
    }
    // Numbers stay numbers: below zero too, which a spreadsheet reads as a figure and not as a formula.
    for (const [key, cell] of [
      ['number', cells[1]],
      ['count', cells[3]],
    ] as const)
      if (cell === undefined || !isNumber(cell) || Number(cell) !== wanted[key])
        faults.push(`${key} ${wanted[key]} came back as ${cell}`)
  })
  return faults
}

const BATCH = 50

async function check(): Promise<void> {
  const made = fc.sample(row, { numRuns: rows, seed: SEED })
  const faults: string[] = []
  for (let at = 0; at < made.length; at += BATCH) faults.push(...faultsOf(made.slice(at, at + BATCH)))
  for (const fault of faults.slice(0, 5)) console.log(`- ${fault}`)
  const pass = faults.length === 0
  const figure = `${faults.length} faults in ${made.length * CELLS_A_ROW} cells`
  await writeReport({ id: 'SEC-6-csv', figure, bar: 'none', pass, seed: SEED })
  process.exitCode = pass ? 0 : 1
}

void check()
