import { statfs } from 'node:fs/promises'

import { Router } from 'express'

import { countLateEffects, hasMigrations, touchDatabase } from '@/server/health/health-store'
import { isStopping } from '@/server/health/stopping'
import { photoFolder } from '@/server/photos/photo-files'

const LATE_AFTER_MS = 5 * 60_000
const PATIENCE_MS = 1500
/** Room for a handful of photos; below it uploads would begin to fail. */
const LEAST_FREE_BYTES = 64 * 1024 * 1024

function withPatience<T>(work: Promise<T>): Promise<T> {
  const tired = new Promise<never>((_, fail) => {
    setTimeout(() => fail(new Error('too slow')), PATIENCE_MS).unref()
  })
  return Promise.race([work, tired])
}

async function hasRoom(): Promise<boolean> {
  const { bavail, bsize } = await statfs(photoFolder())
  return bavail * bsize >= LEAST_FREE_BYTES
}

const isSo = (work: Promise<unknown>): Promise<boolean> =>
  withPatience(work).then(
    (answer) => answer !== false,
    () => false,
  )

/** `/healthz`: the process lives. `/readyz`: it can serve, else what is missing; and how many effects are late. */
export function healthRoutes(): Router {
  const router = Router()
  router.get('/healthz', (_req, res) => {
    res.setHeader('cache-control', 'no-store')
    res.json({ alive: true })
  })
  router.get('/readyz', async (_req, res) => {
    res.setHeader('cache-control', 'no-store')
    const late = withPatience(countLateEffects(new Date(Date.now() - LATE_AFTER_MS))).catch(() => null)
    const needs = await Promise.all([isSo(touchDatabase()), isSo(hasMigrations()), isSo(hasRoom())])
    const missing = ['database', 'migrations', 'disk'].filter((_, at) => !needs[at])
    if (isStopping()) missing.push('stopping')
    const lateEffects = await late
    if (missing.length > 0) res.status(503).json({ ready: false, missing })
    else res.json({ ready: true, lateEffects })
  })
  return router
}
