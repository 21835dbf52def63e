import path from 'node:path'

import { ROOT } from './project-root.mjs'

/**
 * @typedef {object} Own what this start has made for the server
 * @property {string} dataDir
 * @property {number} port
 * @property {number} clockOffsetMs
 * @property {string} databaseUrl
 * @property {import('./secrets.mjs').Secrets} secrets
 * @property {{ smtp: number, mail: number, pay: number, weather: number }} ports
 */

/** Which hosted services the environment names: those are used, and no local stand-in is started. @param {Record<string, string | undefined>} environment */
export const namedIn = (environment) => ({
  database: Boolean(environment.DATABASE_URL),
  mail: Boolean(environment.SMTP_URL),
  payments: Boolean(environment.STRIPE_SECRET_KEY),
  // Real growers must never read invented weather: in production there is a real service, or none.
  forecast: Boolean(environment.FORECAST_URL) || environment.NODE_ENV === 'production',
})

/**
 * The settings of server/env.ts. What the environment says wins over what we made up.
 * @param {Own} own @param {Record<string, string | undefined>} environment
 */
export function serverEnvironment(own, environment) {
  const named = namedIn(environment)
  const production = environment.NODE_ENV === 'production'
  const origin = `http://127.0.0.1:${own.port}`
  const made = {
    NODE_ENV: 'development',
    HOST: '127.0.0.1',
    PUBLIC_ORIGIN: origin,
    DATABASE_URL: own.databaseUrl,
    AUTH_SECRET: own.secrets.auth,
    SMTP_URL: `smtp://127.0.0.1:${own.ports.smtp}`,
    UPLOAD_DIR: path.join(own.dataDir, 'uploads'),
    WEB_DIR: path.join(ROOT, 'dist'),
    // Invented people do not belong in a named database, and their cards not at a real processor.
    DEMO: production || named.database || named.payments ? 'off' : 'on',
    ...(own.clockOffsetMs === 0 ? {} : { CLOCK_OFFSET_MS: String(own.clockOffsetMs) }),
    ...(named.forecast ? {} : { FORECAST_URL: `http://127.0.0.1:${own.ports.weather}` }),
    ...(named.payments
      ? {}
      : {
          STRIPE_SECRET_KEY: own.secrets.stripeKey,
          STRIPE_WEBHOOK_SECRET: own.secrets.stripeWebhook,
          STRIPE_API_BASE: `http://127.0.0.1:${own.ports.pay}`,
        }),
  }
  return { ...made, ...environment, PORT: String(own.port) }
}
