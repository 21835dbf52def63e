import type Stripe from 'stripe'
import { badParameter } from '../failure'
import { presentList } from '../objects/list'
import type { Form } from './form'
import { integerOf, textOf } from './form'

interface Found<R extends { id: string }, T> {
  url: string
  /** Oldest first, as the books hold them. */
  rows: R[]
  present(row: R): T
}

export const pageParameters = {
  ending_before: 'text',
  expand: 'list',
  limit: 'integer',
  starting_after: 'text',
} as const

function indexOf(rows: { id: string }[], form: Form, name: string): number | null {
  const id = textOf(form, name)
  if (id === null) return null
  const index = rows.findIndex((row) => row.id === id)
  if (index < 0) throw badParameter(name, `No such object to page from: '${id}'`, 'resource_missing')
  return index
}

/** Newest first; `limit` 1 to 100, 10 unless said otherwise. */
export function listPage<R extends { id: string }, T>(form: Form, found: Found<R, T>): Stripe.ApiList<T> {
  const limit = integerOf(form, 'limit') ?? 10
  if (limit < 1 || limit > 100) throw badParameter('limit', 'Limit must lie between 1 and 100.')
  const rows = [...found.rows].reverse()
  const after = indexOf(rows, form, 'starting_after')
  const before = indexOf(rows, form, 'ending_before')
  const from = after !== null ? after + 1 : before !== null ? Math.max(0, before - limit) : 0
  const to = before !== null && after === null ? before : from + limit
  const hasMore = before !== null && after === null ? from > 0 : rows.length > to
  return presentList(found.url, rows.slice(from, to).map(found.present), hasMore)
}

/** `created` as one second or a range. */
export const createdParameters = {
  created: { gt: 'integer', gte: 'integer', lt: 'integer', lte: 'integer' },
} as const

export function isCreatedIn(form: Form, createdS: number): boolean {
  const gt = integerOf(form, 'created[gt]')
  const gte = integerOf(form, 'created[gte]')
  const lt = integerOf(form, 'created[lt]')
  const lte = integerOf(form, 'created[lte]')
  return (
    (gt === null || createdS > gt) &&
    (gte === null || createdS >= gte) &&
    (lt === null || createdS < lt) &&
    (lte === null || createdS <= lte)
  )
}
