import express, { Router } from 'express'

import { keepEvent } from '@/server/stripe-events/keep-event'
import { readWebhook } from '@/payments/read-webhook'
import { Problem } from '@/shared/api/problem'

/**
 * The processor's webhook: signature over the raw bytes, kept once, answered at once. A worker applies it by reading
 * the object's present state, so the order in which events arrive does not matter.
 */
export function stripeEvents(): Router {
  const router = Router()
  router.post(
    '/stripe-events',
    express.raw({ type: 'application/json', limit: '256kb' }),
    async (req, res) => {
      const body: unknown = req.body
      if (!Buffer.isBuffer(body)) throw new Problem('wrong-kind')
      let event
      try {
        event = readWebhook({ rawBody: body, signature: req.get('stripe-signature') })
      } catch {
        throw new Problem('body-unreadable', 'The signature does not match.')
      }
      await keepEvent(event)
      res.setHeader('cache-control', 'no-store')
      res.json({ received: true })
    },
  )
  return router
}
