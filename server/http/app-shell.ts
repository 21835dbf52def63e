import { readFileSync, statSync } from 'node:fs'
import path from 'node:path'

import type { Request } from 'express'

import { escapeHtml } from '@/server/mail/escape-html'

const FIRST_HEADING = /<h1>[^<]*<\/h1>/
const CHOSEN_THEME = /(?:^|;\s*)theme=(light|dark)(?:;|$)/

let kept: { file: string; mtimeMs: number; html: string } | null = null

function readShell(webDir: string): string {
  const file = path.join(webDir, 'index.html')
  const { mtimeMs } = statSync(file)
  if (kept?.file !== file || kept.mtimeMs !== mtimeMs)
    kept = { file, mtimeMs, html: readFileSync(file, 'utf8') }
  return kept.html
}

/**
 * The app's page as it is seen before any script has run: with the heading of the page that was asked for, or with
 * none, and in the light or dark that this browser's reader has chosen. Only the home page keeps its own heading.
 * Throws where the web app was not exported.
 */
export function appShell(webDir: string, req: Request, heading = ''): string {
  const theme = CHOSEN_THEME.exec(req.headers.cookie ?? '')?.[1]
  const html = readShell(webDir)
  const dressed = theme ? html.replace('<html ', `<html data-theme="${theme}" `) : html
  if (req.path === '/') return dressed
  return dressed.replace(FIRST_HEADING, () => (heading ? `<h1>${escapeHtml(heading)}</h1>` : ''))
}
