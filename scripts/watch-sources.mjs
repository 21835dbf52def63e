import { watch } from 'node:fs'
import path from 'node:path'

import { exportWeb, WEB_INPUTS } from './export-web.mjs'
import { sentenceOf } from './fault.mjs'
import { ROOT } from './project-root.mjs'
import { step, tell } from './tell.mjs'

const SETTLE_MS = 300
const SERVER_FOLDERS = ['server', 'db', 'payments', 'shared']

/**
 * Restarts the server when a source changes, and makes the web app anew when one of its own did.
 * @param {import('./crew.mjs').Crew} crew @param {import('./start-product.mjs').Product} product
 */
export function watchSources(crew, product) {
  /** @type {NodeJS.Timeout | undefined} */
  let settle
  let work = Promise.resolve()
  const refresh = async () => {
    try {
      await exportWeb(crew)
      await step('Server again', product.restartServer)
    } catch (error) {
      if (!crew.isLeaving()) tell(sentenceOf(error))
    }
  }
  for (const place of new Set([...SERVER_FOLDERS, ...WEB_INPUTS])) {
    watch(path.join(ROOT, place), { recursive: true }, () => {
      clearTimeout(settle)
      settle = setTimeout(() => (work = work.then(refresh)), SETTLE_MS)
    }).on('error', () => undefined)
  }
  tell('Watching the sources: the server restarts after each change.')
}
