import type { IncomingMessage } from 'node:http'

export interface Incoming {
  method: string
  path: string
  query: string
  headers: Record<string, string | undefined>
  body: string
}

const LONGEST_BODY_BYTES = 1_048_576

/** Null when the body is longer than any call of this API could be. */
export async function readIncoming(request: IncomingMessage): Promise<Incoming | null> {
  const parts: Buffer[] = []
  let bytes = 0
  for await (const part of request) {
    const chunk: Buffer = part
    bytes += chunk.length
    if (bytes > LONGEST_BODY_BYTES) return null
    parts.push(chunk)
  }
  const url = new URL(request.url ?? '/', 'http://practice.invalid')
  const headers: Incoming['headers'] = {}
  for (const [name, value] of Object.entries(request.headers))
    headers[name] = Array.isArray(value) ? value[0] : value
  return {
    method: request.method ?? 'GET',
    path: decodeURI(url.pathname),
    query: url.search.slice(1),
    headers,
    body: Buffer.concat(parts).toString('utf8'),
  }
}
