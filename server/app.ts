import { toNodeHandler } from 'better-auth/node'
import compression from 'compression'
import express, { type Express, Router } from 'express'

import { theAuth } from '@/server/auth/auth'
import { problemHandler, unknownPath } from '@/server/http/problem-handler'
import { requestLog } from '@/server/http/request-id'
import { sameOrigin } from '@/server/http/same-origin'
import { securityHeaders } from '@/server/http/security-headers'
import { webApp } from '@/server/http/web-app'
import { healthRoutes } from '@/server/health/health-routes'
import { listingRoutes } from '@/server/listings/listing-routes'
import { unsubscribeRoutes } from '@/server/mail/unsubscribe-routes'
import { memberRoutes } from '@/server/members/member-routes'
import { moderationRoutes } from '@/server/moderation/moderation-routes'
import { noticeRoutes } from '@/server/notices/notice-routes'
import { calendarRoutes } from '@/server/orders/calendar-routes'
import { openapiRoutes } from '@/server/openapi/openapi-routes'
import { orderRoutes } from '@/server/orders/order-routes'
import { weatherRoutes } from '@/server/weather/weather-routes'
import { packingRoutes } from '@/server/packing/packing-routes'
import { photoFiles } from '@/server/photos/photo-files'
import { photoRoutes } from '@/server/photos/photo-routes'
import { placeRoutes } from '@/server/places/place-routes'
import { ratingRoutes } from '@/server/ratings/rating-routes'
import { searchRoutes } from '@/server/search/search-routes'
import { sellerRoutes } from '@/server/sellers/seller-routes'
import { statementRoutes } from '@/server/statements/statement-routes'
import { sessionRoutes } from '@/server/sessions/session-routes'
import { shareRoutes } from '@/server/share/share-routes'
import { shipRoutes } from '@/server/shipping/ship-routes'
import { tripRoutes } from '@/server/trips/trip-routes'
import { stripeEvents } from '@/server/stripe-events/stripe-events'

export interface AppSettings {
  origins: string[]
  https: boolean
  webDir: string
  trustProxyHops: number
}

function api(origins: string[]): Router {
  const router = Router()
  router.use(sameOrigin(origins))
  router.use(express.json({ limit: '256kb', strict: true }))
  router.use(
    placeRoutes(),
    memberRoutes(),
    sessionRoutes(),
    sellerRoutes(),
    statementRoutes(),
    photoRoutes(),
    searchRoutes(),
  )
  router.use(listingRoutes(), tripRoutes(), orderRoutes(), weatherRoutes(), calendarRoutes(), shipRoutes())
  router.use(ratingRoutes(), moderationRoutes(), noticeRoutes())
  router.use(packingRoutes(), openapiRoutes())
  router.use(unknownPath)
  return router
}

/** Scripts and styles are compressed when they are built, photos already are. */
const isPackedHere: compression.CompressionFilter = (req, res) =>
  (req.path.startsWith('/api/') || String(res.getHeader('content-type')).startsWith('text/html')) &&
  compression.filter(req, res)

/** Mounts everything in the order a request meets it. */
export function buildApp(settings: AppSettings): Express {
  const app = express()
  app.set('trust proxy', settings.trustProxyHops)
  app.disable('x-powered-by')
  app.use(requestLog())
  app.use(securityHeaders({ webDir: settings.webDir, https: settings.https }))
  app.use(healthRoutes())
  app.use((req, _res, next) => {
    // better-auth limits by this header alone; whatever a client sent under its name is overwritten here.
    req.headers['x-tankward-ip'] = req.ip ?? '0.0.0.0'
    next()
  })
  app.all('/api/auth/*splat', toNodeHandler(theAuth()))
  // The webhook is signed over its raw bytes: it stands before every body parser and outside the origin check.
  app.use('/api/v1', stripeEvents())
  app.use(compression({ filter: isPackedHere }))
  app.use('/api/v1', api(settings.origins))
  app.use('/photos', photoFiles())
  app.use(unsubscribeRoutes())
  app.use(shareRoutes({ webDir: settings.webDir, origin: settings.origins[0] ?? '' }))
  app.use(webApp(settings.webDir))
  app.use(unknownPath)
  app.use(problemHandler)
  return app
}
