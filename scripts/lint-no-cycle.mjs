import path from 'node:path'

import { importCycles } from './import-cycles.mjs'
import { ROOT } from './project-root.mjs'

const FOLDERS = [
  'app',
  'components',
  'constants',
  'db',
  'hooks',
  'payments',
  'scripts',
  'seed',
  'server',
  'shared',
  'tests',
]

/** @type {Map<string, string> | null} */
let cycles = null

/**
 * No file may load itself by way of others. The usual rule reads the whole tree through another parser for this, which
 * takes longer than all other rules together; this one reads the import lines once a run.
 * @type {import('eslint').Rule.RuleModule}
 */
export const noCycle = {
  meta: { type: 'problem', schema: [] },
  create: (context) => ({
    Program(node) {
      cycles ??= importCycles(ROOT, FOLDERS)
      const next = cycles.get(context.filename)
      if (!next) return
      const message = `This file loads itself by way of ${path.relative(ROOT, next)}.`
      context.report({ node, message })
    },
  }),
}
