import { ApiFailure } from '../failure'
import { endpoints } from '../routes/endpoints'
import type { Endpoint } from './endpoint'

export interface FoundEndpoint {
  endpoint: Endpoint
  id: string
}

const known = endpoints.map((endpoint) => ({
  endpoint,
  pattern: new RegExp(`^${endpoint.path.replace(':id', '([^/]+)')}$`),
}))

export function findEndpoint(method: string, path: string): FoundEndpoint {
  for (const { endpoint, pattern } of known) {
    const match = endpoint.method === method ? pattern.exec(path) : null
    if (match) return { endpoint, id: match[1] ?? '' }
  }
  const message = `Unrecognized request URL (${method}: ${path}): not imitated by this practice processor.`
  throw new ApiFailure(404, { type: 'invalid_request_error', message })
}
