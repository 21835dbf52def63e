import { Router } from 'express'

import { mountedEndpoints } from '@/server/http/mounted-endpoints'
import { buildDocument } from '@/server/openapi/build-document'

/** The description of this API for programs; made once, when somebody first asks. */
export function openapiRoutes(): Router {
  const router = Router()
  let text: string | undefined
  router.get('/openapi.json', (_req, res) => {
    text ??= JSON.stringify(buildDocument(mountedEndpoints()))
    res.setHeader('cache-control', 'no-cache')
    res.type('json').send(text)
  })
  return router
}
