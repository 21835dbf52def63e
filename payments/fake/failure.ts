export interface ErrorBody {
  type: 'api_error' | 'card_error' | 'idempotency_error' | 'invalid_request_error'
  message: string
  code?: string
  decline_code?: string
  param?: string
  charge?: string
  payment_intent?: object
}

/**
 * An answer that is not a success, in the processor's shape. `began` says that the act was under way: only then is
 * the answer kept for the idempotency key. `keeps` says that what was written so far stays (a declined attempt).
 */
export class ApiFailure extends Error {
  readonly status: number
  readonly body: ErrorBody
  readonly began: boolean
  readonly keeps: boolean

  constructor(status: number, body: ErrorBody, how: { began?: boolean; keeps?: boolean } = {}) {
    super(body.message)
    this.status = status
    this.body = body
    this.began = how.began ?? how.keeps ?? false
    this.keeps = how.keeps ?? false
  }
}

/** The request itself is wrong (a parameter): nothing began, the idempotency key stays free. */
export function badParameter(param: string, message: string, code?: string): ApiFailure {
  return new ApiFailure(400, { type: 'invalid_request_error', message, param, code })
}

export function missingObject(kind: string, id: string, param = 'id'): ApiFailure {
  const message = `No such ${kind}: '${id}'`
  return new ApiFailure(404, { type: 'invalid_request_error', code: 'resource_missing', message, param })
}

/** The request is well formed and the act refused; the answer is kept for its idempotency key. */
export function refusal(
  code: string | undefined,
  message: string,
  more: Partial<ErrorBody> = {},
): ApiFailure {
  return new ApiFailure(400, { type: 'invalid_request_error', code, message, ...more }, { began: true })
}
