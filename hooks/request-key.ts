/** A fresh idempotency key: made once when a form opens, sent with every try of the same act. */
export function newRequestKey(): string {
  const bytes = crypto.getRandomValues(new Uint8Array(16))
  return Array.from(bytes, (byte) => byte.toString(16).padStart(2, '0')).join('')
}
