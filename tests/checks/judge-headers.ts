export interface Answered {
  /** What kind of answer it is, for people. */
  kind: string
  status: number
  headers: Headers
}

const YEAR_S = 31_536_000

/** Directives every policy must hold, whatever else it says. */
const PAGE_POLICY = ["default-src 'none'", "object-src 'none'", "base-uri 'none'", "frame-ancestors 'none'"]
const UPLOAD_POLICY = ['sandbox', "default-src 'none'", "frame-ancestors 'none'"]

function policyFaults(policy: string): string[] {
  const directives = policy.split(';').map((part) => part.trim())
  const wanted = directives.includes('sandbox') ? UPLOAD_POLICY : PAGE_POLICY
  const missing = wanted.filter((one) => !directives.includes(one)).map((one) => `no ${one}`)
  const loose = directives.filter((one) => /'unsafe-|(?:^|\s)(?:\*|https?:)(?:\s|$)/.test(one))
  return [...missing, ...loose.map((one) => `loose: ${one}`)]
}

/** What is wrong with the headers of one answer (robustness 1.2: V3.4; 1.3), each as a few words. */
export function headerFaults({ kind, status, headers }: Answered, https: boolean): string[] {
  const faults: string[] = []
  const expect = (isRight: boolean, what: string) => isRight || faults.push(`${kind} (${status}): ${what}`)
  const policy = headers.get('content-security-policy')
  expect(policy !== null, 'no content security policy')
  if (policy !== null) for (const fault of policyFaults(policy)) expect(false, fault)
  expect(headers.get('x-content-type-options') === 'nosniff', 'no nosniff')
  expect(
    /^(no-referrer|same-origin|strict-origin|strict-origin-when-cross-origin)$/.test(
      headers.get('referrer-policy') ?? '',
    ),
    'no referrer policy',
  )
  expect(/^(DENY|SAMEORIGIN)$/.test(headers.get('x-frame-options') ?? ''), 'no x-frame-options')
  expect(!headers.has('access-control-allow-origin'), 'other origins are let in')
  expect(!headers.has('x-powered-by'), 'says what it is made with')
  const hsts = headers.get('strict-transport-security') ?? ''
  const isLong = Number(/max-age=(\d+)/.exec(hsts)?.[1] ?? 0) >= YEAR_S && /includeSubDomains/i.test(hsts)
  expect(https ? isLong : hsts === '', https ? 'no HSTS' : 'HSTS without https')
  const type = headers.get('content-type')
  // JSON is UTF-8 by its own standard (RFC 8259, 8.1) and needs no charset; what a browser renders does.
  const isText =
    type !== null && /^(text\/(?:html|css|javascript)|application\/(?:xml|javascript))/.test(type)
  expect(!isText || /charset=utf-8/i.test(type), `no charset: ${type}`)
  return faults
}
