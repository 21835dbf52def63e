import { createHash } from 'node:crypto'

import { escapeHtml } from '@/server/mail/escape-html'

const STYLE =
  ':root{color-scheme:light dark}body{margin:0;padding:24px 16px;font:17px/1.5 system-ui,sans-serif}main{max-width:34rem;margin:0 auto}button{min-height:48px;padding:0 20px;font:inherit;font-weight:600;background:#2A3579;color:#fff;border:0;border-radius:4px}a{display:inline-block;min-height:44px;padding:10px 0;color:inherit}:focus-visible{outline:3px solid #2A3579;outline-offset:2px}'

/** Stricter than the app's own policy: no script at all, and this one style. */
export const PAGE_POLICY = `default-src 'none'; style-src 'sha256-${createHash('sha256').update(STYLE).digest('base64')}'; form-action 'self'; base-uri 'none'; object-src 'none'; frame-ancestors 'none'`

interface Told {
  heading: string
  text: string
  /** Where the button sends its POST; without it there is no button. */
  action?: string
}

/** A page that works without script and without signing in. */
export function unsubscribePage({ heading, text, action }: Told): string {
  const form = action
    ? `<form method="post" action="${escapeHtml(action)}"><input type="hidden" name="List-Unsubscribe" value="One-Click"><button>Stop these mails</button></form>`
    : ''
  return `<!doctype html><html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width,initial-scale=1"><meta name="robots" content="noindex"><title>${escapeHtml(heading)} - Tankward</title><style>${STYLE}</style></head><body><main><h1>${escapeHtml(heading)}</h1><p>${escapeHtml(text)}</p>${form}<p><a href="/me">Open your account</a></p></main></body></html>`
}
