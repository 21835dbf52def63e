import { Router } from 'express'

import { countLateEffects, touchDatabase } from '@/server/health/health-store'

const LATE_AFTER_MS = 5 * 60_000
const PATIENCE_MS = 1500

function withPatience<T>(work: Promise<T>): Promise<T> {
  const tired = new Promise<never>((_, fail) => {
    setTimeout(() => fail(new Error('too slow')), PATIENCE_MS).unref()
  })
  return Promise.race([work, tired])
}

/** `/healthz`: the process lives. `/readyz`: it can serve; says how many effects are late. */
export function healthRoutes(): Router {
  const router = Router()
  router.get('/healthz', (_req, res) => {
    res.setHeader('cache-control', 'no-store')
    res.json({ alive: true })
  })
  router.get('/readyz', async (_req, res) => {
    res.setHeader('cache-control', 'no-store')
    try {
      await withPatience(touchDatabase())
      const lateEffects = await withPatience(countLateEffects(new Date(Date.now() - LATE_AFTER_MS)))
      res.json({ ready: true, lateEffects })
    } catch {
      res.status(503).json({ ready: false })
    }
  })
  return router
}
