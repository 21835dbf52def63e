import { createHmac } from 'node:crypto'

/** `t=…,v1=…`: HMAC-SHA256 over "seconds.payload". Real time: whoever receives it compares with the real clock. */
export function signatureHeader(payload: string, secret: string, sentAtS: number): string {
  const signature = createHmac('sha256', secret).update(`${sentAtS}.${payload}`, 'utf8').digest('hex')
  return `t=${sentAtS},v1=${signature}`
}
