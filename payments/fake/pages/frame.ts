import type { Answer } from '../http/answer'
import { html, type Html } from './html'
import { styleHash, styleTag } from './style'

interface Page {
  title: string
  body: Html
  status?: number
  isWide?: boolean
  /** Other places a form on this page may lead to (the browser checks redirects too). */
  leadsTo?: (string | null)[]
}

function originsOf(addresses: (string | null)[]): string[] {
  return addresses.filter((address) => address !== null).map((address) => new URL(address).origin)
}

export function page({ title, body, status = 200, isWide = false, leadsTo = [] }: Page): Answer {
  const width = isWide ? 'wide' : 'narrow'
  const whole = html`<!doctype html>
    <html lang="en">
      <head>
        <meta charset="utf-8" />
        <meta name="viewport" content="width=device-width, initial-scale=1" />
        <title>${title} – practice card processor</title>
        ${styleTag}
      </head>
      <body>
        <header class="${width}"><p>Practice card processor</p></header>
        <main class="${width}">${body}</main>
        <footer class="${width}">
          This page runs on your own computer and stands in for the card processor's site.
        </footer>
      </body>
    </html>`
  const formAction = ["'self'", ...originsOf(leadsTo)].join(' ')
  const policy = `default-src 'none'; style-src 'sha256-${styleHash}'; form-action ${formAction}; base-uri 'none'; frame-ancestors 'none'`
  return {
    status,
    headers: {
      'content-type': 'text/html; charset=utf-8',
      'cache-control': 'no-store',
      'content-security-policy': policy,
      'referrer-policy': 'no-referrer',
      'x-content-type-options': 'nosniff',
    },
    body: whole.markup,
  }
}

export const practiceNote = html`<p class="note">
  <strong>Practice only.</strong> No real card is charged here and no money moves. Never type the number of a
  real card.
</p>`

export function redirect(address: string): Answer {
  return { status: 303, headers: { location: address, 'cache-control': 'no-store' }, body: '' }
}

export function lostPage(): Answer {
  const body = html`<h1>Nothing here</h1>
    <p>
      This address leads to no open page of the practice card processor. Go back to where you came from and
      start again there.
    </p>`
  return page({ title: 'Nothing here', status: 404, body })
}
