import { createServer, type Server } from 'node:http'

import express from 'express'

import { stripeEvents } from '@/server/stripe-events/stripe-events'

export interface WebhookDoor {
  close: () => Promise<void>
}

/**
 * The product's own webhook, at the address where its server will stand: the processor's events are kept and applied
 * while the demo is played, instead of piling up for the first start.
 */
export async function openWebhookDoor(address: { host: string; port: number }): Promise<WebhookDoor> {
  const app = express()
  app.use('/api/v1', stripeEvents())
  const server = await new Promise<Server>((done, fail) => {
    const made = createServer(app)
    made.once('error', (error: NodeJS.ErrnoException) =>
      fail(
        error.code === 'EADDRINUSE'
          ? new Error(`Port ${address.port} is taken: stop Tankward first, then seed again.`)
          : error,
      ),
    )
    made.listen(address.port, address.host, () => done(made))
  })
  return {
    close: () =>
      new Promise((done) => {
        server.close(() => done())
        server.closeAllConnections()
      }),
  }
}
