import { configurePayments } from '@/payments/stripe'
import { seedDemo } from '@/seed/demo/seed-demo'
import { openWebhookDoor } from '@/seed/demo/webhook-door'
import { openAuth } from '@/server/auth/auth'
import { readSettings } from '@/server/env'
import { configureForecast } from '@/server/forecast/forecast-settings'
import { log } from '@/server/log'
import { configureOrders } from '@/server/orders/order-settings'
import { configurePhotos } from '@/server/photos/photo-files'

/** Sets the product up with the settings its server will have, and plays the demo in it. */
export async function playDemo(options: { say: (line: string) => void }): Promise<void> {
  const settings = readSettings()
  log.level = 'warn'
  const { PUBLIC_ORIGIN: origin, STRIPE_API_BASE: processor } = settings
  if (!processor) {
    throw new Error('The demo pays with practice cards: STRIPE_API_BASE must name the practice processor.')
  }
  const { hostname: host, port, protocol } = new URL(processor)
  openAuth({ secret: settings.AUTH_SECRET, origin, alsoTrusted: [] })
  configureOrders({ origin, feeBp: settings.FEE_BP })
  configureForecast({ url: settings.FORECAST_URL ?? null })
  configurePhotos({ dir: settings.UPLOAD_DIR })
  configurePayments({
    secretKey: settings.STRIPE_SECRET_KEY,
    webhookSecret: settings.STRIPE_WEBHOOK_SECRET,
    ...{ host, port: Number(port), protocol: protocol === 'https:' ? 'https' : 'http' },
  })
  const door = await openWebhookDoor({ host: settings.HOST, port: settings.PORT })
  try {
    await seedDemo({ ...options, clockOffsetMs: settings.CLOCK_OFFSET_MS })
  } finally {
    await door.close()
  }
}
