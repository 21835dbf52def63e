import { mkdirSync } from 'node:fs'

import { Router } from 'express'

import { Problem } from '@/shared/api/problem'

const NAME = /^[0-9a-f]{32}-(320|800|1600)\.webp$/
const YEAR_S = 31_536_000

let folder: string | undefined

/** Where photos are kept; said once at start. */
export function configurePhotos({ dir }: { dir: string }): void {
  mkdirSync(dir, { recursive: true, mode: 0o750 })
  folder = dir
}

export function photoFolder(): string {
  if (!folder) throw new Error('configurePhotos() has not been called')
  return folder
}

/** Serves the kept sizes. Names never change their content; even opened as a page, a file can do nothing. */
export function photoFiles(): Router {
  const router = Router()
  router.get('/:file', (req, res, next) => {
    const { file } = req.params
    if (!NAME.test(file)) throw new Problem('not-found')
    const headers = {
      'content-type': 'image/webp',
      'content-disposition': `inline; filename="${file}"`,
      'content-security-policy': "sandbox; default-src 'none'; frame-ancestors 'none'",
      'x-content-type-options': 'nosniff',
      'cache-control': `public, max-age=${YEAR_S}, immutable`,
    }
    res.sendFile(file, { root: photoFolder(), headers, cacheControl: false, dotfiles: 'deny' }, (error) => {
      if (error && !res.headersSent) next(new Problem('not-found'))
    })
  })
  return router
}
