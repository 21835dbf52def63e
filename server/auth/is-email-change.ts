/** Whether a link's token moves an account to another address. better-auth has signed it; this only reads it. */
export function isEmailChange(token: string): boolean {
  const payload: unknown = JSON.parse(Buffer.from(token.split('.')[1] ?? '', 'base64url').toString('utf8'))
  return typeof payload === 'object' && payload !== null && 'updateTo' in payload
}
