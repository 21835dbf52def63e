import { readFile } from 'node:fs/promises'

const LINES = 12

/** The end of a log; of a crash, the part that names it. @param {string} file */
export async function lastWords(file) {
  const text = await readFile(file, 'utf8').catch(() => '')
  const lines = text
    .trimEnd()
    .split('\n')
    .slice(-5 * LINES)
  const named = lines.findLastIndex((line) => /^(?:\w*Error\b|Uncaught)/.test(line))
  return (named < 0 ? lines.slice(-LINES) : lines.slice(named, named + LINES)).join('\n')
}
