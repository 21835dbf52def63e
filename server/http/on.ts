import type { Request, Response, Router } from 'express'
import type { z } from 'zod'

import { readCaller } from '@/server/auth/read-caller'
import { admit, type Caller } from '@/server/http/caller'
import { withIdempotency } from '@/server/http/idempotency'
import { fieldProblems } from '@/server/http/field-problems'
import { noteMounted } from '@/server/http/mounted-endpoints'
import { uploadedFile, type UploadedFile } from '@/server/http/uploaded-file'
import type { Endpoint, ParsedBody, ParsedParams, ParsedQuery, ReplyOf } from '@/shared/api/endpoint'
import { Problem, type FieldProblem } from '@/shared/api/problem'

type CallerFor<E> = E extends { auth: 'public' } ? Caller | null : Caller

export interface Asked<E> {
  caller: CallerFor<E>
  params: ParsedParams<E>
  query: ParsedQuery<E>
  body: ParsedBody<E>
  /** The caller's idempotency key, when the endpoint asks one: the command id of the change. */
  key: string
  file: UploadedFile | undefined
}

type Handler<E> = (asked: Asked<E>) => Promise<ReplyOf<E>>

function parsePart(schema: z.ZodType | undefined, given: unknown, at: string): [unknown, FieldProblem[]] {
  if (!schema) return [undefined, []]
  const read = schema.safeParse(given)
  return read.success ? [read.data, []] : [undefined, fieldProblems(read.error, at)]
}

function readKey(req: Request, endpoint: Endpoint): string {
  if (!endpoint.idempotent) return ''
  const key = req.get('idempotency-key')
  if (!key || !/^[\w-]{16,80}$/.test(key)) {
    throw new Problem('key-missing', 'Send an Idempotency-Key of 16 to 80 letters, digits, - or _.')
  }
  return key
}

/**
 * Mounts one endpoint: session, access, parse (every field error at once), idempotency, the use case, and the
 * reply parsed through its contract, so that no column leaves by accident.
 */
export function on<E extends Endpoint>(router: Router, endpoint: E) {
  noteMounted(endpoint)
  const method = endpoint.method.toLowerCase() as 'get' | 'post' | 'patch' | 'delete'
  return (handler: Handler<E>): void => {
    router[method](endpoint.path, async (req: Request, res: Response) => {
      const caller = await readCaller(req)
      res.locals.memberId = caller?.memberId
      admit(caller, endpoint.auth)
      const file = endpoint.upload ? await uploadedFile(req, res) : undefined
      const [params, badParams] = parsePart(endpoint.params, req.params, 'path')
      // A path that cannot name anything names nothing: the same answer as for a thing that is gone.
      if (badParams.length > 0) throw new Problem('not-found')
      const [query, badQuery] = parsePart(endpoint.query, req.query, 'query')
      const [body, badBody] = parsePart(endpoint.body, req.body ?? {}, '#')
      const errors = [...badQuery, ...badBody]
      if (errors.length > 0) throw new Problem('fields-invalid', undefined, { errors })
      const key = readKey(req, endpoint)
      const asked = { caller, params, query, body, key, file } as Asked<E>
      const run = async () => {
        const reply = await handler(asked)
        return endpoint.reply ? endpoint.reply.parse(reply) : undefined
      }
      const reply =
        endpoint.idempotent && caller
          ? await withIdempotency({ memberId: caller.memberId, key, endpoint, body: { params, body } }, run)
          : await run()
      res.setHeader('cache-control', caller || endpoint.method !== 'GET' ? 'no-store' : 'no-cache')
      if (reply === undefined) res.status(204).end()
      else if (endpoint.replyMedia) res.type(endpoint.replyMedia).send(Buffer.from(reply as Uint8Array))
      else res.status(endpoint.status ?? 200).json(reply)
    })
  }
}
