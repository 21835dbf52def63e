import { parseArgs } from 'node:util'

export interface FakeSettings {
  host: string
  port: number
  /** Where a browser reaches the pages; null: http://host:port. */
  publicOrigin: string | null
  booksFolder: string
  /** Null: events are written down and sent nowhere. */
  webhookUrl: string | null
  webhookSecret: string
  platformOrigin: string
  clockOffsetMs: number
  /** Null: the control endpoints do not exist. */
  controlToken: string | null
  /** The platform's own money at the processor when the books are new. Its fees and losses are paid from it. */
  openingBalanceCents: number
  /** Hours until captured money may be transferred. */
  fundsDelayHours: number
  /** Pause before the second try of a webhook; every later pause is longer. */
  webhookFirstGapMs: number
}

const options = {
  host: { type: 'string' },
  port: { type: 'string' },
  'public-origin': { type: 'string' },
  books: { type: 'string' },
  'webhook-url': { type: 'string' },
  'webhook-secret': { type: 'string' },
  'platform-origin': { type: 'string' },
  'clock-offset': { type: 'string' },
  'control-token': { type: 'string' },
  'opening-balance-cents': { type: 'string' },
  'funds-delay-hours': { type: 'string' },
  'webhook-first-gap-ms': { type: 'string' },
} as const

type Option = keyof typeof options

function wholeNumber(name: Option, text: string): number {
  if (!/^-?\d+$/.test(text)) throw new Error(`--${name} wants a whole number, not "${text}"`)
  return Number(text)
}

/** `--clock-offset -5` as well as `--clock-offset=-5`: the parser takes a lone leading dash for a new option. */
function withNegatives(args: string[]): string[] {
  return args
    .join('\0')
    .replace(/\0(-\d+)(?=\0|$)/g, '=$1')
    .split('\0')
}

/** `--webhook-url` on the command line, else `PAYMENTS_FAKE_WEBHOOK_URL` in the environment, and so on. */
export function readSettings(args: string[], env: Record<string, string | undefined>): FakeSettings {
  const { values } = parseArgs({ args: args.length > 0 ? withNegatives(args) : [], options, strict: true })
  const given = (name: Option) =>
    values[name] ?? env[`PAYMENTS_FAKE_${name.toUpperCase().replaceAll('-', '_')}`]
  const text = (name: Option, fallback: string) => given(name) || fallback
  const count = (name: Option, fallback: number) => wholeNumber(name, text(name, String(fallback)))
  return {
    host: text('host', '127.0.0.1'),
    port: count('port', 0),
    publicOrigin: given('public-origin') || null,
    booksFolder: text('books', '.data/payments-fake'),
    webhookUrl: given('webhook-url') || null,
    webhookSecret: text('webhook-secret', 'whsec_practice'),
    platformOrigin: text('platform-origin', 'http://127.0.0.1:3000'),
    clockOffsetMs: count('clock-offset', 0),
    controlToken: given('control-token') || null,
    openingBalanceCents: count('opening-balance-cents', 500_000),
    fundsDelayHours: count('funds-delay-hours', 0),
    webhookFirstGapMs: count('webhook-first-gap-ms', 1000),
  }
}
