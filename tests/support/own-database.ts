import path from 'node:path'

import { migrateDatabase } from '@/db/migrate'
import { startMariadb } from '@/scripts/mariadb.mjs'
import type { TestDatabase } from '@/tests/support/test-database'

export interface OwnDatabase extends TestDatabase {
  /** Kills the server without a goodbye, as a power cut would. */
  kill: () => Promise<void>
  /** Starts it again on the same port and the same data. */
  startAgain: () => Promise<void>
}

const NAME = 'tankward'

/** A database server for one test file alone, durable as in production, to be killed and started again. */
export async function startOwnDatabase(label: string): Promise<OwnDatabase> {
  const options = {
    dir: path.resolve('.data/test-servers', `${label}-${process.pid}`),
    durable: true,
    bufferPoolMb: 64,
    databases: [NAME],
  }
  let server = await startMariadb(options)
  const { port } = server
  await migrateDatabase(server.url(NAME, 'owner'))
  return {
    name: NAME,
    url: server.url(NAME),
    ownerUrl: server.url(NAME, 'owner'),
    drop: () => server.remove(),
    kill: async () => {
      process.kill(server.pid, 'SIGKILL')
      for (;;) {
        try {
          process.kill(server.pid, 0)
        } catch {
          return
        }
        await new Promise((done) => setTimeout(done, 20))
      }
    },
    startAgain: async () => {
      server = await startMariadb({ ...options, port })
    },
  }
}
