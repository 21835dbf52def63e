import type { Endpoint } from '@/shared/api/endpoint'

const mounted = new Map<string, Endpoint>()

/** `on` notes whatever it mounts, so that what we publish about the API is what there is. */
export function noteMounted(endpoint: Endpoint): void {
  mounted.set(`${endpoint.method} ${endpoint.path}`, endpoint)
}

export function mountedEndpoints(): Endpoint[] {
  return [...mounted.values()]
}
