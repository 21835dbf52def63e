import { describe, expect, it } from 'vitest'
import { readSettings } from './settings'

describe('settings of the practice processor', () => {
  it('come from the command line first, from the environment second', () => {
    const env = { PAYMENTS_FAKE_PORT: '4000', PAYMENTS_FAKE_WEBHOOK_URL: 'http://127.0.0.1:3000/hook' }
    const settings = readSettings(['--port', '4001', '--clock-offset', '-86400000'], env)
    expect(settings).toMatchObject({
      port: 4001,
      webhookUrl: 'http://127.0.0.1:3000/hook',
      clockOffsetMs: -86_400_000,
      controlToken: null,
    })
  })

  it('refuse what is no number, and names nobody knows', () => {
    expect(() => readSettings(['--port', 'http'], {})).toThrow('--port wants a whole number')
    expect(() => readSettings(['--prot', '1'], {})).toThrow()
  })
})
