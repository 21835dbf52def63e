import { isProblemSlug, Problem, type ProblemDocument, type ProblemSlug } from '@/shared/api/problem'
import type { BodyOf, ParamsOf, QueryOf, ReplyOf } from '@/shared/api/endpoint'
import { routes, type Endpoints } from '@/shared/api/routes.gen'

export type CallName = keyof Endpoints

type Part<K extends string, T> = [T] extends [undefined] ? { [P in K]?: undefined } : { [P in K]: T }

export type CallInput<N extends CallName> = Part<'params', ParamsOf<Endpoints[N]>> &
  Part<'query', QueryOf<Endpoints[N]>> &
  Part<'body', BodyOf<Endpoints[N]>> & { key?: string; file?: Blob; signal?: AbortSignal }

/** The network is away or the server did not answer: no problem document came back. */
export class NoAnswer extends Error {
  constructor() {
    super('No connection. What you typed is kept; try again in a moment.')
    this.name = 'NoAnswer'
  }
}

function fillPath(path: string, params: Record<string, string> | undefined): string {
  return path.replace(/:(\w+)/g, (_, name: string) => encodeURIComponent(params?.[name] ?? ''))
}

function queryText(query: Record<string, unknown> | undefined): string {
  const pairs = new URLSearchParams()
  for (const [name, value] of Object.entries(query ?? {})) {
    if (value === undefined || value === null || value === '') continue
    for (const one of Array.isArray(value) ? value : [value]) pairs.append(name, String(one))
  }
  const text = pairs.toString()
  return text ? `?${text}` : ''
}

async function readProblem(response: Response): Promise<Problem> {
  try {
    const told = (await response.json()) as ProblemDocument
    const slug = told.type.split('/').pop() ?? ''
    const known: ProblemSlug = isProblemSlug(slug) ? slug : 'internal'
    return new Problem(known, told.detail, { errors: told.errors, facts: told.facts })
  } catch {
    return new Problem(response.status >= 500 ? 'try-again' : 'internal')
  }
}

/** JSON as what it says; anything else (a PDF) as its bytes. */
async function readReply(response: Response): Promise<unknown> {
  if (response.status === 204) return undefined
  const isJson = response.headers.get('content-type')?.includes('json') ?? true
  return isJson ? response.json() : new Uint8Array(await response.arrayBuffer())
}

/** Makes the one typed API client. `base` is '' on the web (same origin), an address in the native app. */
export function createCall(base: string) {
  return async function call<N extends CallName>(
    name: N,
    input: CallInput<N>,
  ): Promise<ReplyOf<Endpoints[N]>> {
    const [method, path, isUpload] = routes[name]
    const { params, query, body, key, file, signal } = input as CallInput<CallName> & { body?: unknown }
    const headers: Record<string, string> = { accept: 'application/json', 'x-tankward': '1' }
    if (key) headers['idempotency-key'] = key
    let payload: BodyInit | undefined
    if (isUpload) {
      const form = new FormData()
      for (const [field, value] of Object.entries(body ?? {})) form.append(field, String(value))
      if (file) form.append('file', file)
      payload = form
    } else if (body !== undefined) {
      headers['content-type'] = 'application/json'
      payload = JSON.stringify(body)
    }
    const address = `${base}/api/v1${fillPath(path, params as Record<string, string> | undefined)}${queryText(query as Record<string, unknown> | undefined)}`
    let response: Response
    try {
      response = await fetch(address, { method, headers, body: payload, credentials: 'include', signal })
    } catch (error) {
      if (signal?.aborted) throw error
      throw new NoAnswer()
    }
    if (!response.ok) throw await readProblem(response)
    return (await readReply(response)) as ReplyOf<Endpoints[N]>
  }
}
