import path from 'node:path'

import type { TestProject } from 'vitest/node'

import { migrateDatabase } from '@/db/migrate'
import { startMariadb } from '@/scripts/mariadb.mjs'
import { sweepLeftovers } from '@/scripts/mariadb-leftover.mjs'

export interface TestServer {
  /** Signs in as the owner, to the migrated database that every test file gets a copy of. */
  templateUrl: string
  /** Address of any test database, as the app signs in. */
  appUrl: string
}

declare module 'vitest' {
  interface ProvidedContext {
    testServer: TestServer
  }
}

export const TEST_PREFIX = 'tankward_test_'
const TEMPLATE = `${TEST_PREFIX}template`
const PARENT = path.resolve('.data/test-servers')

/** One throw-away server a run, migrated once. Servers of runs that were killed are ended first. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  await sweepLeftovers(PARENT)
  const server = await startMariadb({
    dir: path.join(PARENT, `integration-${process.pid}`),
    durable: false,
    bufferPoolMb: 128,
    databases: [TEMPLATE],
    testPrefix: TEST_PREFIX,
  })
  await migrateDatabase(server.url(TEMPLATE, 'owner'))
  project.provide('testServer', {
    templateUrl: server.url(TEMPLATE, 'owner'),
    appUrl: server.url(TEMPLATE),
  })
  return () => server.remove()
}
