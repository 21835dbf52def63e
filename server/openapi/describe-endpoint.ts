import { z } from 'zod'

import type { Endpoint } from '@/shared/api/endpoint'

export type JsonSchema = Record<string, unknown>

interface Described {
  operation: Record<string, unknown>
  schemas: Record<string, JsonSchema>
}

/** What a client sends, or what it gets. A schema of OpenAPI 3.1 is one of JSON Schema 2020-12. */
function jsonSchemaOf(schema: z.ZodType, io: 'input' | 'output'): JsonSchema {
  const { $schema: _dialect, ...rest } = z.toJSONSchema(schema, { io, unrepresentable: 'any' })
  return rest
}

function parametersOf(schema: z.ZodType | undefined, where: 'path' | 'query') {
  if (!schema) return []
  const { properties = {}, required = [] } = jsonSchemaOf(schema, 'input') as {
    properties?: Record<string, JsonSchema>
    required?: string[]
  }
  return Object.entries(properties).map(([name, inner]) => ({
    name,
    in: where,
    required: where === 'path' || required.includes(name),
    schema: inner,
  }))
}

const keyParameter = {
  name: 'Idempotency-Key',
  in: 'header',
  required: true,
  description: 'One a press; a repeat of the same request gets the same answer.',
  schema: { type: 'string', pattern: '^[\\w-]{16,80}$' },
}

/** The refusals this call can meet, by what it asks for. */
function refusalsOf({ auth, params, query, body, idempotent, upload, method }: Endpoint): number[] {
  const isUnsafe = method !== 'GET'
  return [
    ...(body || idempotent || upload ? [400] : []),
    ...(auth === 'public' ? [] : [401]),
    ...(auth !== 'public' || isUnsafe ? [403] : []),
    404,
    ...(isUnsafe ? [409, 415] : []),
    ...(body || upload ? [413] : []),
    ...(params || query || body || idempotent || upload ? [422] : []),
    ...[429, 500, 503],
    ...(upload ? [507] : []),
  ]
}

function requestBodyOf(endpoint: Endpoint, ref: string) {
  if (endpoint.upload) {
    const file = { type: 'string', contentMediaType: 'application/octet-stream' }
    const schema = { type: 'object', required: ['file'], properties: { file } }
    return { requestBody: { required: true, content: { 'multipart/form-data': { schema } } } }
  }
  if (!endpoint.body) return {}
  return { requestBody: { required: true, content: { 'application/json': { schema: { $ref: ref } } } } }
}

function replyContent({ replyMedia }: Endpoint, ref: string) {
  if (!replyMedia) return { 'application/json': { schema: { $ref: ref } } }
  return { [replyMedia]: { schema: { type: 'string', contentMediaType: replyMedia } } }
}

/** One call as an OpenAPI operation, with the schemas it names. */
export function describeEndpoint(name: string, endpoint: Endpoint): Described {
  const { auth, body, reply, idempotent, summary } = endpoint
  const ref = (what: string) => `#/components/schemas/${name}${what}`
  const refusals = refusalsOf(endpoint).map((status) => [status, { $ref: '#/components/responses/Problem' }])
  const success = {
    description: summary,
    ...(reply ? { content: replyContent(endpoint, ref('Reply')) } : {}),
  }
  return {
    operation: {
      operationId: name,
      summary,
      ...(auth === 'public' ? {} : { security: [{ session: [] }], 'x-role': auth }),
      parameters: [
        ...parametersOf(endpoint.params, 'path'),
        ...parametersOf(endpoint.query, 'query'),
        ...(idempotent ? [keyParameter] : []),
      ],
      ...requestBodyOf(endpoint, ref('Body')),
      responses: { [endpoint.status ?? 200]: success, ...Object.fromEntries(refusals) },
    },
    schemas: {
      ...(body && !endpoint.upload ? { [`${name}Body`]: jsonSchemaOf(body, 'input') } : {}),
      ...(reply && !endpoint.replyMedia ? { [`${name}Reply`]: jsonSchemaOf(reply, 'output') } : {}),
    },
  }
}
