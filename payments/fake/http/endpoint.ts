import type { Turn } from '../turn'
import type { Form } from './form'
import type { Shape } from './shape'

export interface ApiRequest {
  turn: Turn
  form: Form
  /** The `:id` of the path, '' where there is none. */
  id: string
  /** The connected account named in the `Stripe-Account` header. */
  accountId: string | null
}

/** One call of the API: path, the parameters it takes, and the act. The answer is an object of the processor. */
export interface Endpoint {
  method: 'GET' | 'POST'
  path: `/v1/${string}`
  accepts: Shape
  answer(request: ApiRequest): object
}
