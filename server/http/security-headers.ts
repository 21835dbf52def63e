import { createHash } from 'node:crypto'
import { existsSync, readFileSync } from 'node:fs'
import path from 'node:path'

import type { RequestHandler } from 'express'
import helmet from 'helmet'

// react-native-web opens an empty <style> and fills it through CSSOM: the hash of the empty string lets it in.
const EMPTY_STYLE = "'sha256-47DEQpj8HBSa+/TImW+5JCeuQeRkm5NMpJWZG3hSuFU='"

function inlineStyleHashes(webDir: string): string[] {
  const file = path.join(webDir, 'index.html')
  if (!existsSync(file)) return []
  const styles = readFileSync(file, 'utf8').matchAll(/<style[^>]*>([\s\S]*?)<\/style>/g)
  return [...styles].map(
    ([, css]) =>
      `'sha256-${createHash('sha256')
        .update(css ?? '')
        .digest('base64')}'`,
  )
}

/** Headers of every answer. HSTS only where the site is served over https: loopback cannot hold it. */
export function securityHeaders(options: { webDir: string; https: boolean }): RequestHandler {
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'none'"],
        scriptSrc: ["'self'"],
        connectSrc: ["'self'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        fontSrc: ["'self'"],
        styleSrc: ["'self'", ...inlineStyleHashes(options.webDir), EMPTY_STYLE],
        manifestSrc: ["'self'"],
        workerSrc: ["'self'"],
        baseUri: ["'none'"],
        objectSrc: ["'none'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
        requireTrustedTypesFor: ["'script'"],
      },
    },
    strictTransportSecurity: options.https ? { maxAge: 63_072_000, includeSubDomains: true } : false,
    referrerPolicy: { policy: 'strict-origin-when-cross-origin' },
    crossOriginEmbedderPolicy: false,
    crossOriginResourcePolicy: { policy: 'same-origin' },
  })
}
