import { afterAll, beforeAll, expect, it } from 'vitest'

import { outbox } from '@/db/schema/outbox'
import { openTestServer, type TestServer } from '@/tests/support/server'

/** More than the pool has connections: a sign-up that held one and asked for another would stop everything. */
const NEWCOMERS = 40

let server: TestServer
beforeAll(async () => {
  server = await openTestServer('many_sign_ups')
})
afterAll(() => server.close())

it('lets a crowd sign up at once, and writes to each of them', async () => {
  const replies = await Promise.all(
    Array.from({ length: NEWCOMERS }, (_, n) =>
      server
        .visitor()
        .post('/api/auth/sign-up/email')
        .send({
          name: `Newcomer ${n}`,
          email: `newcomer${n}@example.org`,
          password: 'heron-lattice-paddle-31',
        }),
    ),
  )
  expect(replies.map((reply) => reply.status)).toEqual(replies.map(() => 200))
  expect(await server.db.$count(outbox)).toBe(NEWCOMERS)
  await server.visitor().get('/readyz').expect(200)
}, 60_000)
