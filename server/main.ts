import { createServer } from 'node:http'

import { connect, disconnect } from '@/db/client'
import { buildApp } from '@/server/app'
import { openAuth } from '@/server/auth/auth'
import { setClockOffset } from '@/server/clock'
import { readSettings, type Settings } from '@/server/env'
import { configureForecast } from '@/server/forecast/forecast-settings'
import { isStopping, noteStopping } from '@/server/health/stopping'
import { jobsOf } from '@/server/jobs/jobs'
import { startJobs } from '@/server/jobs/job-runner'
import { log } from '@/server/log'
import { configureMail } from '@/server/mail/send-mail'
import { configureUnsubscribe } from '@/server/mail/unsubscribe-token'
import { configureOrders } from '@/server/orders/order-settings'
import { registerDoers } from '@/server/outbox/doers'
import { armFailPoint } from '@/server/outbox/fail-point'
import { configurePhotos } from '@/server/photos/photo-files'
import { configurePayments } from '@/payments/stripe'

const STOP_WITHIN_MS = 10_000

function loopbackNames(origin: string): string[] {
  const { hostname, port, protocol } = new URL(origin)
  if (hostname !== '127.0.0.1' && hostname !== 'localhost') return []
  return ['127.0.0.1', 'localhost'].map((name) => `${protocol}//${name}:${port}`)
}

function paymentSettings(settings: Settings) {
  const base = settings.STRIPE_API_BASE ? new URL(settings.STRIPE_API_BASE) : undefined
  return {
    secretKey: settings.STRIPE_SECRET_KEY,
    webhookSecret: settings.STRIPE_WEBHOOK_SECRET,
    ...(base
      ? ({
          host: base.hostname,
          port: Number(base.port),
          protocol: base.protocol === 'https:' ? 'https' : 'http',
        } as const)
      : {}),
  }
}

function main(): void {
  const settings = readSettings()
  log.level = settings.LOG_LEVEL
  setClockOffset(settings.CLOCK_OFFSET_MS)
  connect(settings.DATABASE_URL)
  const alsoTrusted = loopbackNames(settings.PUBLIC_ORIGIN)
  openAuth({ secret: settings.AUTH_SECRET, origin: settings.PUBLIC_ORIGIN, alsoTrusted })
  configureMail({ smtpUrl: settings.SMTP_URL, from: settings.MAIL_FROM })
  configureUnsubscribe({ origin: settings.PUBLIC_ORIGIN, secret: settings.AUTH_SECRET })
  configurePayments(paymentSettings(settings))
  configurePhotos({ dir: settings.UPLOAD_DIR })
  configureOrders({ origin: settings.PUBLIC_ORIGIN, feeBp: settings.FEE_BP })
  configureForecast({ url: settings.FORECAST_URL ?? null })
  armFailPoint(settings.FAIL_POINT)
  registerDoers()

  const app = buildApp({
    origins: [settings.PUBLIC_ORIGIN, ...alsoTrusted],
    https: settings.PUBLIC_ORIGIN.startsWith('https://'),
    webDir: settings.WEB_DIR,
    trustProxyHops: settings.TRUST_PROXY_HOPS,
  })
  const server = createServer(
    { headersTimeout: 10_000, requestTimeout: 30_000, keepAliveTimeout: 5_000, maxHeaderSize: 16_384 },
    app,
  )
  server.maxConnections = 1024
  // On the way out a kept connection ends with its answer, so that the client takes its next request elsewhere.
  server.prependListener('request', (_req, res) => {
    if (isStopping()) res.setHeader('connection', 'close')
  })
  server.on('error', (error: NodeJS.ErrnoException) => {
    log.fatal(
      { err: error },
      error.code === 'EADDRINUSE' ? `port ${settings.PORT} is in use` : 'the server failed',
    )
    process.exit(1)
  })
  server.listen(settings.PORT, settings.HOST, () =>
    log.info({ address: settings.PUBLIC_ORIGIN }, 'listening'),
  )
  const jobs = settings.JOBS === 'on' ? startJobs(jobsOf()) : undefined

  let stopping = false
  const stop = async (signal: string): Promise<void> => {
    if (stopping) return
    stopping = true
    noteStopping()
    log.info({ signal }, 'stopping')
    setTimeout(() => process.exit(1), STOP_WITHIN_MS).unref()
    server.closeIdleConnections()
    await new Promise<void>((done) => server.close(() => done()))
    await jobs?.stop()
    await disconnect()
    process.exit(0)
  }
  process.on('SIGTERM', () => void stop('SIGTERM'))
  process.on('SIGINT', () => void stop('SIGINT'))
}

main()
