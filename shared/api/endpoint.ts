import type { z } from 'zod'

export type Role = 'member' | 'seller' | 'moderator' | 'admin'

/** Who may call: `public` needs no session; a role means "signed in with that role or a stronger one". */
export type Access = 'public' | Role

type Schema = z.ZodType
type Nothing = undefined

export interface EndpointSpec<
  P extends Schema | Nothing,
  Q extends Schema | Nothing,
  B extends Schema | Nothing,
  R extends Schema | Nothing,
> {
  method: 'GET' | 'POST' | 'PATCH' | 'DELETE'
  /** Path under /api/v1, Express form: `/listings/:listingId`. */
  path: `/${string}`
  auth: Access
  /** True for whatever moves stock or money: the caller must send an Idempotency-Key. */
  idempotent?: boolean
  /** multipart upload of one file field named `file`; the body schema then describes the text fields. */
  upload?: boolean
  params?: P
  query?: Q
  body?: B
  /** Absent: 204, nothing to say. */
  reply?: R
  /** The reply is bytes of this kind instead of JSON. */
  replyMedia?: 'application/pdf' | 'text/csv'
  /** 200 unless said otherwise; 201 for things created. */
  status?: 200 | 201 | 204
  summary: string
}

export type Endpoint<
  P extends Schema | Nothing = Schema | Nothing,
  Q extends Schema | Nothing = Schema | Nothing,
  B extends Schema | Nothing = Schema | Nothing,
  R extends Schema | Nothing = Schema | Nothing,
> = EndpointSpec<P, Q, B, R> & { kind: 'endpoint' }

type In<S> = S extends Schema ? z.input<S> : undefined
type Out<S> = S extends Schema ? z.output<S> : undefined

/** What a client sends (before defaults are filled in). */
export type ParamsOf<E> = E extends Endpoint<infer P, infer _Q, infer _B, infer _R> ? In<P> : never
export type QueryOf<E> = E extends Endpoint<infer _P, infer Q, infer _B, infer _R> ? In<Q> : never
export type BodyOf<E> = E extends Endpoint<infer _P, infer _Q, infer B, infer _R> ? In<B> : never
export type ReplyOf<E> = E extends Endpoint<infer _P, infer _Q, infer _B, infer R> ? Out<R> : never

/** What a server handler receives (parsed, defaults filled in). */
export type ParsedParams<E> = E extends Endpoint<infer P, infer _Q, infer _B, infer _R> ? Out<P> : never
export type ParsedQuery<E> = E extends Endpoint<infer _P, infer Q, infer _B, infer _R> ? Out<Q> : never
export type ParsedBody<E> = E extends Endpoint<infer _P, infer _Q, infer B, infer _R> ? Out<B> : never

/** Declares one call of the API: the server mounts it, the client calls it, tests enumerate it. */
export function endpoint<
  P extends Schema | Nothing = Nothing,
  Q extends Schema | Nothing = Nothing,
  B extends Schema | Nothing = Nothing,
  R extends Schema | Nothing = Nothing,
>(spec: EndpointSpec<P, Q, B, R>): Endpoint<P, Q, B, R> {
  return { kind: 'endpoint', ...spec }
}
