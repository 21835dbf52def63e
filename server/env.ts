import { z } from 'zod'

// The only reader of process.env: read, check, hand on as typed settings.
const SAMPLE = /sample|change-me|example|^sk_test_local|^whsec_local/i

const flag = z.enum(['on', 'off'])

const shape = z.object({
  NODE_ENV: z.enum(['development', 'test', 'production']).default('development'),
  HOST: z.string().default('127.0.0.1'),
  PORT: z.coerce.number().int().min(0).max(65535).default(8080),
  PUBLIC_ORIGIN: z.url(),
  DATABASE_URL: z.string().regex(/^mysql:\/\//, 'must start with mysql://'),
  AUTH_SECRET: z.string().min(32, 'must have at least 32 characters'),
  STRIPE_SECRET_KEY: z.string().regex(/^sk_/, 'must be a secret key of the payment processor'),
  STRIPE_WEBHOOK_SECRET: z.string().regex(/^whsec_/, 'must be the signing secret of the webhook'),
  STRIPE_API_BASE: z.url().optional(),
  FORECAST_URL: z.url().optional(),
  SMTP_URL: z.string().regex(/^smtps?:\/\//, 'must start with smtp:// or smtps://'),
  MAIL_FROM: z.email().default('hello@tankward.example'),
  UPLOAD_DIR: z.string().min(1),
  WEB_DIR: z.string().default('dist'),
  TRUST_PROXY_HOPS: z.coerce.number().int().min(0).max(5).default(0),
  JOBS: flag.default('on'),
  LOG_LEVEL: z.enum(['silent', 'error', 'warn', 'info', 'debug']).default('info'),
  FEE_BP: z.coerce.number().int().min(0).max(3000).default(600),
  CLOCK_OFFSET_MS: z.coerce.number().int().default(0),
  DEMO: flag.default('off'),
  /** Where the crash proof lets the process die (server/outbox/fail-point.ts). */
  FAIL_POINT: z.string().optional(),
})

export type Settings = z.output<typeof shape>

const SECRETS = ['AUTH_SECRET', 'STRIPE_SECRET_KEY', 'STRIPE_WEBHOOK_SECRET'] as const

/** What production refuses, each with the name of the variable at fault. */
function productionFaults(settings: Settings): string[] {
  if (settings.NODE_ENV !== 'production') return []
  const faults: string[] = SECRETS.filter((name) => SAMPLE.test(settings[name])).map(
    (name) => `${name} still holds a sample value`,
  )
  if (!settings.PUBLIC_ORIGIN.startsWith('https://')) faults.push('PUBLIC_ORIGIN must start with https://')
  if (settings.STRIPE_API_BASE) faults.push('STRIPE_API_BASE is for local work only')
  if (settings.CLOCK_OFFSET_MS !== 0) faults.push('CLOCK_OFFSET_MS is for local work only')
  if (settings.FAIL_POINT !== undefined) faults.push('FAIL_POINT is for local work only')
  if (settings.DEMO === 'on') faults.push('DEMO must be off')
  return faults
}

/** Reads and checks the settings; throws one sentence a fault, naming the variable. */
export function readSettings(environment: NodeJS.ProcessEnv = process.env): Settings {
  const read = shape.safeParse(environment)
  if (!read.success) {
    const lines = read.error.issues.map((issue) => {
      const name = String(issue.path[0])
      return environment[name] === undefined ? `${name} is missing` : `${name} ${issue.message}`
    })
    throw new Error(`The settings are not complete (see .env.example):\n- ${lines.join('\n- ')}`)
  }
  const faults = productionFaults(read.data)
  if (faults.length > 0) throw new Error(`Refusing to start in production:\n- ${faults.join('\n- ')}`)
  return read.data
}
