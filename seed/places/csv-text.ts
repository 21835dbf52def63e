type Cell = string | number

/** Comment lines, a head and rows; a cell with a comma or a quote is quoted. Ends with a line break. */
export function csvText(
  comments: readonly string[],
  head: readonly string[],
  rows: readonly Cell[][],
): string {
  const lines = [head, ...rows].map((row) => row.map(quoted).join(','))
  return [...comments.map((comment) => `# ${comment}`), ...lines, ''].join('\n')
}

function quoted(cell: Cell): string {
  const text = String(cell)
  return /[",\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text
}
