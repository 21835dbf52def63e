import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { buildMember } from '@/seed/build-member'
import type { Endpoint } from '@/shared/api/endpoint'
import { problems, type ProblemDocument } from '@/shared/api/problem'
import { everyEndpoint } from '@/tests/support/every-endpoint'
import { keyed, openTestServer, type TestServer } from '@/tests/support/server'

const NOWHERE = 'A'.repeat(22)
const address = (endpoint: Endpoint) =>
  `/api/v1${endpoint.path.replace(/:versionId/, '4000000000').replace(/:\w+/g, NOWHERE)}`
type Verb = 'get' | 'post' | 'patch' | 'delete'
const verb = (endpoint: Endpoint) => endpoint.method.toLowerCase() as Verb

/** Every answer that is not a success is one problem document of the closed list. */
function expectProblem(response: {
  status: number
  body: unknown
  headers: Record<string, string>
}): ProblemDocument {
  expect(response.headers['content-type']).toContain('application/problem+json')
  const told = response.body as ProblemDocument
  const slug = told.type.replace('/problems/', '') as keyof typeof problems
  expect(problems[slug]?.status, told.type).toBe(response.status)
  expect(told.status).toBe(response.status)
  expect(told.detail.length).toBeGreaterThan(5)
  return told
}

const endpoints = await everyEndpoint()
let server: TestServer

beforeAll(async () => {
  server = await openTestServer('contract')
  await buildMember(server.db, { email: 'plain@example.org', name: 'Plain Member' })
})
afterAll(() => server.close())

describe('every endpoint of the contracts', () => {
  it('is found by this test', () => {
    expect(endpoints.length).toBeGreaterThan(30)
  })

  const guarded = endpoints.filter(([, endpoint]) => endpoint.auth !== 'public')
  it.each(guarded)('%s asks a visitor to sign in', async (_name, endpoint) => {
    const response = await server.visitor()[verb(endpoint)](address(endpoint)).set(keyed()).send({})
    expect(response.status).toBe(401)
    expectProblem(response)
  })

  const raised = guarded.filter(([, endpoint]) => endpoint.auth !== 'member')
  it('has endpoints for sellers and staff', () => expect(raised.length).toBeGreaterThan(5))
  it('refuses a plain member wherever a seller or staff is asked for', async () => {
    const member = await server.signedIn('plain@example.org')
    for (const [name, endpoint] of raised) {
      const response = await member[verb(endpoint)](address(endpoint)).set(keyed()).send({})
      expect(response.status, name).toBe(403)
      expectProblem(response)
    }
  })

  it('answers junk in a body with the fields at fault, never with a fault of its own', async () => {
    const member = await server.signedIn('plain@example.org')
    const open = endpoints.filter(
      ([, one]) => one.body && !one.upload && ['public', 'member'].includes(one.auth),
    )
    for (const [name, endpoint] of open) {
      const response = await member[verb(endpoint)](address(endpoint))
        .set(keyed())
        .send({ role: 'admin', __proto__: { admin: true }, quantity: 'many', constructor: 1 })
      expect([404, 422], name).toContain(response.status)
      expectProblem(response)
    }
  })

  it('asks for the key where stock or money moves', async () => {
    const member = await server.signedIn('plain@example.org')
    const keyless = endpoints.filter(([, one]) => one.idempotent && !one.body && one.auth === 'member')
    for (const [name, endpoint] of keyless) {
      const response = await member[verb(endpoint)](address(endpoint))
      expect(response.status, name).toBe(400)
      expect(expectProblem(response).type).toBe('/problems/key-missing')
    }
  })

  it('refuses a state change that another site started', async () => {
    const unsafe = endpoints.filter(([, one]) => one.method !== 'GET')
    for (const [name, endpoint] of unsafe) {
      const visitor = server.visitor()
      const foreign = await visitor[verb(endpoint)](address(endpoint))
        .set('origin', 'https://elsewhere.example')
        .send({})
      expect(foreign.status, name).toBe(403)
      const form = await visitor[verb(endpoint)](address(endpoint)).type('form').send('a=1')
      expect([403, 415], name).toContain(form.status)
    }
  })

  it('knows nothing at other addresses', async () => {
    const response = await server.visitor().get('/api/v1/no-such-thing')
    expect(response.status).toBe(404)
    expect(expectProblem(response).type).toBe('/problems/no-such-path')
  })
})
