import Ajv2020 from 'ajv/dist/2020'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { buildMember } from '@/seed/build-member'
import { loadPlaces } from '@/seed/load-places'
import type { OpenapiDocument } from '@/server/openapi/build-document'
import type { Endpoint } from '@/shared/api/endpoint'
import { everyEndpoint } from '@/tests/support/every-endpoint'
import { openTestServer, type TestServer } from '@/tests/support/server'

interface Operation {
  operationId: string
  parameters: { name: string; in: string; required: boolean; schema: object }[]
  requestBody?: { content: Record<string, { schema: { $ref?: string } }> }
  responses: Record<string, { $ref?: string; content?: Record<string, { schema: { $ref: string } }> }>
}

let server: TestServer
let document: OpenapiDocument
const endpoints = await everyEndpoint()

beforeAll(async () => {
  server = await openTestServer('openapi')
  await loadPlaces(server.db, { states: ['OH'] })
  await buildMember(server.db, { email: 'plain@example.org' })
  const reply = await server.visitor().get('/api/v1/openapi.json').expect(200)
  expect(reply.headers['content-type']).toContain('application/json')
  document = reply.body as OpenapiDocument
})
afterAll(() => server.close())

const pathOf = (endpoint: Endpoint) => endpoint.path.replace(/:(\w+)/g, '{$1}')

/** What the document leaves unsaid about one endpoint. */
function unsaid(told: OpenapiDocument, name: string, endpoint: Endpoint): string[] {
  const operation = told.paths[pathOf(endpoint)]?.[endpoint.method.toLowerCase()] as Operation | undefined
  if (!operation) return [`${name}: not there`]
  const schema = (what: string) => told.components.schemas[`${name}${what}`]
  const faults: string[] = []
  const expectTo = (isSo: boolean, what: string) => isSo || faults.push(`${name}: ${what}`)
  expectTo(operation.operationId === name, 'has another name')
  const body = operation.requestBody?.content['application/json']?.schema.$ref
  if (endpoint.body && !endpoint.upload)
    expectTo(body === `#/components/schemas/${name}Body` && Boolean(schema('Body')), 'no body')
  if (endpoint.upload) expectTo(Boolean(operation.requestBody?.content['multipart/form-data']), 'no upload')
  const success = operation.responses[endpoint.status ?? 200]
  expectTo(Boolean(success), 'no success')
  const reply = success?.content?.['application/json']?.schema.$ref
  if (endpoint.replyMedia) expectTo(Boolean(success?.content?.[endpoint.replyMedia]), 'no bytes')
  else if (endpoint.reply)
    expectTo(reply === `#/components/schemas/${name}Reply` && Boolean(schema('Reply')), 'no reply')
  for (const [, word] of endpoint.path.matchAll(/:(\w+)/g))
    expectTo(
      operation.parameters.some((one) => one.name === word && one.in === 'path' && one.required),
      `no parameter ${word}`,
    )
  const refusals = Object.entries(operation.responses).filter(([status]) => Number(status) >= 400)
  expectTo(
    refusals.length > 3 && refusals.every(([, one]) => one.$ref === '#/components/responses/Problem'),
    'refusals are not problems',
  )
  if (endpoint.auth !== 'public') expectTo('401' in operation.responses, 'no 401')
  if (endpoint.idempotent)
    expectTo(
      operation.parameters.some((one) => one.name === 'Idempotency-Key'),
      'no key',
    )
  return faults
}

describe('the published description of the API', () => {
  it('says everything of every endpoint, and nothing of what is not there', () => {
    expect(endpoints.flatMap(([name, endpoint]) => unsaid(document, name, endpoint))).toEqual([])
    const told = Object.values(document.paths).flatMap((one) => Object.keys(one))
    expect(told).toHaveLength(endpoints.length)
    expect(document.openapi).toMatch(/^3\.1\./)
  })

  it('would be noticed to leave something out', () => {
    const [name, endpoint] = endpoints.find(([, one]) => one.body && one.reply) ?? []
    if (!name || !endpoint) throw new Error('no endpoint has a body')
    const copy = () => structuredClone(document)
    const gone = copy()
    delete gone.paths[pathOf(endpoint)]
    const bodiless = copy()
    delete bodiless.components.schemas[`${name}Body`]
    const bare = copy()
    const operation = bare.paths[pathOf(endpoint)]?.[endpoint.method.toLowerCase()] as unknown as Operation
    operation.responses = { 200: {} }
    for (const spoilt of [gone, bodiless, bare]) expect(unsaid(spoilt, name, endpoint)).not.toEqual([])
  })

  it('has schemas that compile, with every reference resolved', () => {
    const ajv = new Ajv2020({ strict: false, validateFormats: false })
    ajv.addSchema({ $id: 'tankward', ...document })
    for (const name of Object.keys(document.components.schemas))
      expect(ajv.getSchema(`tankward#/components/schemas/${name}`), name).toBeTypeOf('function')
    const text = JSON.stringify(document)
    for (const [, ref = ''] of text.matchAll(/"\$ref":"#\/components\/(\w+\/\w+)"/g)) {
      const [kind = '', name = ''] = ref.split('/')
      const part = (document.components as unknown as Record<string, Record<string, unknown>>)[kind]
      expect(part?.[name], ref).toBeDefined()
    }
  })

  it('fits what the server answers', async () => {
    const ajv = new Ajv2020({ strict: false, validateFormats: false })
    ajv.addSchema({ $id: 'tankward', ...document })
    const fits = (name: string, given: unknown) => {
      const check = ajv.getSchema(`tankward#/components/schemas/${name}`)
      return check?.(given) === true ? [] : (check?.errors ?? ['no such schema'])
    }
    const visitor = server.visitor()
    const member = await server.signedIn('plain@example.org')
    const near = '/api/v1/listings?near=45202'
    expect(fits('searchListingsReply', (await visitor.get(near)).body)).toEqual([])
    expect(fits('findPlacesReply', (await visitor.get('/api/v1/places?q=Cin')).body)).toEqual([])
    expect(fits('readMeReply', (await member.get('/api/v1/me')).body)).toEqual([])
    expect(fits('listOrdersReply', (await member.get('/api/v1/orders')).body)).toEqual([])
    for (const address of ['/api/v1/orders', '/api/v1/nothing', '/api/v1/listings?limit=many'])
      expect(fits('Problem', (await visitor.get(address)).body)).toEqual([])
    expect(fits('searchListingsReply', { items: [{ listingId: 1 }] })).not.toEqual([])
  })
})
