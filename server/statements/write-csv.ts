import { stringify } from 'csv-stringify/sync'

/** A table for spreadsheets: numbers stay numbers, text that a spreadsheet would run as a formula is defused (SEC-6). */
export function writeCsv<Row extends Record<string, string | number>>(
  rows: readonly Row[],
  columns: readonly { key: keyof Row & string; header: string }[],
): Uint8Array<ArrayBuffer> {
  const text = stringify([...rows], {
    header: true,
    columns: columns.map(({ key, header }) => ({ key, header })),
    escape_formulas: true,
    record_delimiter: 'windows',
    // Spreadsheets take a file without this mark for the code page of their machine.
    bom: true,
  })
  return new TextEncoder().encode(text)
}
