import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { openTestServer, type TestServer } from '@/tests/support/server'

const asked = {
  species: 'hybrid_bluegill',
  count: 60,
  massG: 2,
  fastedHours: 48,
  startC: 18,
  legs: [{ hours: 12, airC: 18 }],
}
const path = '/api/v1/packing-sheet'

let server: TestServer
beforeAll(async () => {
  server = await openTestServer('packing_sheet')
})
afterAll(() => server.close())

describe('the packing sheet', () => {
  it('comes to a visitor as a PDF', async () => {
    const reply = await server.visitor().post(path).send(asked).buffer(true).expect(200)
    expect(reply.headers['content-type']).toBe('application/pdf')
    expect(
      Buffer.from(reply.body as Uint8Array)
        .subarray(0, 5)
        .toString(),
    ).toBe('%PDF-')
  })

  it('is refused with the reason where no packing is safe, and with the field at fault', async () => {
    const frost = await server
      .visitor()
      .post(path)
      .send({ ...asked, legs: [{ hours: 40, airC: -40 }] })
    expect(frost.status).toBe(409)
    expect(frost.body).toMatchObject({
      type: '/problems/trip-unsafe',
      detail: expect.stringContaining('colder'),
    })
    const dragon = await server
      .visitor()
      .post(path)
      .send({ ...asked, species: 'dragon' })
    expect(dragon.status).toBe(422)
    expect(dragon.body).toMatchObject({ errors: [{ pointer: '#/species' }] })
    const empty = await server
      .visitor()
      .post(path)
      .send({ ...asked, count: 0 })
    expect(empty.status).toBe(422)
  })

  it('is not printed without end', async () => {
    const visitor = server.visitor()
    let last = 0
    for (let at = 0; at < 21 && last !== 429; at++)
      last = (await visitor.post(path).send({ ...asked, count: 0 })).status
    expect(last).toBe(429)
  })
})
