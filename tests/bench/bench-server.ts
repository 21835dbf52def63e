import path from 'node:path'

import { connect, disconnect } from '@/db/client'
import { migrateDatabase } from '@/db/migrate'
import { startMariadb } from '@/scripts/mariadb.mjs'
import { sweepLeftovers } from '@/scripts/mariadb-leftover.mjs'

const PARENT = path.resolve('.data/bench-servers')
const DATABASE = 'tankward_bench'

export interface BenchServer {
  ownerUrl: string
  close: () => Promise<void>
}

/** A server of its own with the product's tables, and the product connected to it by one line. */
export async function openBenchServer(listings: number): Promise<BenchServer> {
  await sweepLeftovers(PARENT)
  const server = await startMariadb({
    dir: path.join(PARENT, `bench-${process.pid}`),
    durable: true,
    bufferPoolMb: listings > 200_000 ? 1_024 : 256,
    databases: [DATABASE],
  })
  const ownerUrl = server.url(DATABASE, 'owner')
  await migrateDatabase(ownerUrl)
  connect(server.url(DATABASE), 1)
  return {
    ownerUrl,
    close: async () => {
      await disconnect()
      await server.remove()
    },
  }
}
