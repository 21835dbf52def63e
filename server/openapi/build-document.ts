import { describeEndpoint, type JsonSchema } from '@/server/openapi/describe-endpoint'
import { problemSchema } from '@/server/openapi/problem-schema'
import type { Endpoint } from '@/shared/api/endpoint'
import { routes } from '@/shared/api/routes.gen'

export interface OpenapiDocument {
  openapi: '3.1.1'
  info: { title: string; version: string }
  servers: { url: string }[]
  paths: Record<string, Record<string, Record<string, unknown>>>
  components: {
    schemas: Record<string, JsonSchema>
    responses: Record<string, unknown>
    securitySchemes: Record<string, unknown>
  }
}

function nameOf({ method, path }: Endpoint): string {
  const found = Object.entries(routes).find(([, [verb, at]]) => verb === method && at === path)
  if (!found) throw new Error(`${method} ${path} is not in the table of routes: npm run routes`)
  return found[0]
}

/** The API as OpenAPI 3.1, made from the same contracts that the server parses with. */
export function buildDocument(endpoints: Endpoint[]): OpenapiDocument {
  const paths: OpenapiDocument['paths'] = {}
  const schemas: Record<string, JsonSchema> = { Problem: problemSchema }
  for (const endpoint of endpoints) {
    const described = describeEndpoint(nameOf(endpoint), endpoint)
    const path = endpoint.path.replace(/:(\w+)/g, '{$1}')
    paths[path] = { ...paths[path], [endpoint.method.toLowerCase()]: described.operation }
    Object.assign(schemas, described.schemas)
  }
  const problem = { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } }
  return {
    openapi: '3.1.1',
    info: { title: 'Tankward', version: '1' },
    servers: [{ url: '/api/v1' }],
    paths,
    components: {
      schemas,
      responses: { Problem: { description: 'What happened and what to do', content: problem } },
      securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: 'better-auth.session_token' } },
    },
  }
}
