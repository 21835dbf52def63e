import { existsSync } from 'node:fs'
import path from 'node:path'

import { Router, static as serveStatic, type Request, type Response } from 'express'

import { appShell } from '@/server/http/app-shell'

const YEAR_S = 31_536_000
const HASHED = /^\/(_expo\/static|assets)\//

function sendPrecompressed(webDir: string) {
  return (req: Request, res: Response, next: () => void): void => {
    const file = path.join(webDir, path.normalize(req.path))
    if (!file.startsWith(path.resolve(webDir)) || !/\.(js|css|html|json|svg|map|txt)$/.test(file))
      return next()
    const accepted = String(req.headers['accept-encoding'] ?? '')
    const packed = [
      ['br', '.br'],
      ['gzip', '.gz'],
    ].find(([name, ending]) => accepted.includes(name ?? '') && existsSync(file + ending))
    res.vary('Accept-Encoding')
    if (packed) {
      res.type(path.extname(file))
      res.setHeader('content-encoding', packed[0] ?? '')
      req.url += packed[1]
    }
    next()
  }
}

/** The exported web app: hashed names for a year, everything else asked again; unknown pages get the shell. */
export function webApp(webDir: string): Router {
  const router = Router()
  const root = path.resolve(webDir)
  const shell = (req: Request, res: Response, next: () => void): void => {
    if (!['GET', 'HEAD'].includes(req.method) || path.extname(req.path) !== '') return next()
    if (!existsSync(path.join(root, 'index.html'))) return next()
    res.setHeader('cache-control', 'no-cache')
    res.vary('Cookie')
    res.type('html').send(appShell(root, req))
  }
  const keep = (res: Response, file: string): void => {
    const forAYear = HASHED.test(file.slice(root.length).replaceAll(path.sep, '/')) || /\.woff2$/.test(file)
    res.setHeader('cache-control', forAYear ? `public, max-age=${YEAR_S}, immutable` : 'no-cache')
  }
  router.use((req, res, next) => shell(req, res, next))
  router.use(sendPrecompressed(root))
  router.use(serveStatic(root, { index: false, setHeaders: keep, dotfiles: 'ignore' }))
  return router
}
