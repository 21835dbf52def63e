import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs'
import path from 'node:path'

const SOURCE = /\.(?:ts|tsx|mjs)$/
// What is imported for its types alone is gone when the program runs; import() is asked for later.
const IMPORTS = /(?:^|\n)\s*(?:import|export)\s+(?!type\b)(?:[^'"`;]*?\bfrom\s*)?['"]([^'"]+)['"]/g
const ENDINGS = ['', '.ts', '.tsx', '.mjs', '/index.ts']

/** @param {string} folder @returns {string[]} */
function sourcesUnder(folder) {
  return readdirSync(folder, { withFileTypes: true, recursive: true })
    .filter((entry) => entry.isFile() && SOURCE.test(entry.name) && !entry.name.endsWith('.d.ts'))
    .map((entry) => path.join(entry.parentPath, entry.name))
}

/** @param {string} root @param {string} from @param {string} named */
function fileOf(root, from, named) {
  if (!named.startsWith('.') && !named.startsWith('@/')) return null
  const base = named.startsWith('@/')
    ? path.join(root, named.slice(2))
    : path.resolve(path.dirname(from), named)
  const found = ENDINGS.map((ending) => base + ending).find(
    (file) => SOURCE.test(file) && existsSync(file) && statSync(file).isFile(),
  )
  return found ?? null
}

/** Each file with the files of ours that it loads. @param {string} root @param {string[]} folders */
function readGraph(root, folders) {
  /** @type {Map<string, string[]>} */
  const graph = new Map()
  for (const file of folders.flatMap((folder) => sourcesUnder(path.join(root, folder)))) {
    const named = [...readFileSync(file, 'utf8').matchAll(IMPORTS)].map((found) => found[1] ?? '')
    graph.set(
      file,
      named.map((one) => fileOf(root, file, one)).filter((one) => one !== null),
    )
  }
  return graph
}

/**
 * Every file that can be reached from itself, with the first step of the way back (Tarjan's components).
 * @param {string} root @param {string[]} folders of the project @returns {Map<string, string>}
 */
export function importCycles(root, folders) {
  const graph = readGraph(root, folders)
  /** @type {Map<string, { index: number, low: number, isOpen: boolean }>} */
  const seen = new Map()
  /** @type {string[]} */
  const open = []
  /** @type {Map<string, string>} */
  const cycles = new Map()
  /** @param {string} file */
  function visit(file) {
    const here = { index: seen.size, low: seen.size, isOpen: true }
    seen.set(file, here)
    open.push(file)
    for (const next of graph.get(file) ?? []) {
      const there = seen.get(next) ?? visit(next)
      if (there.isOpen) here.low = Math.min(here.low, there.low)
    }
    if (here.low === here.index) close(file)
    return here
  }
  /** @param {string} first */
  function close(first) {
    const members = open.splice(open.lastIndexOf(first))
    for (const member of members) {
      const mark = seen.get(member)
      if (mark) mark.isOpen = false
      const next = (graph.get(member) ?? []).find((one) => members.includes(one))
      if (next) cycles.set(member, next)
    }
  }
  for (const file of graph.keys()) if (!seen.has(file)) visit(file)
  return cycles
}
