import { createHash } from 'node:crypto'
import type { Answer } from '../http/answer'
import { html, Html } from './html'

const css = `
:root { color-scheme: light; --ink: #22201c; --soft: #5a544a; --paper: #fbf8f1; --sheet: #fff; --line: #8a8274;
  --act: #6b2a10; --warn: #8c1d18; --note: #fff1c9 }
* { box-sizing: border-box }
body { margin: 0; font: 1.0625rem/1.5 system-ui, sans-serif; color: var(--ink); background: var(--paper) }
header, main, footer { max-width: 34rem; margin: 0 auto; padding: 1rem }
main.wide, header.wide, footer.wide { max-width: 72rem }
header p { margin: 0; font-weight: 700 }
.note { background: var(--note); border-left: .375rem solid var(--act); padding: .75rem 1rem; margin: 0 0 1.5rem }
h1 { font-size: 1.75rem; line-height: 1.2; margin: 0 0 1rem }
h2 { font-size: 1.25rem; margin: 2rem 0 .5rem }
p { margin: 0 0 1rem }
dl { margin: 0 0 1.5rem; background: var(--sheet); border: 1px solid var(--line); padding: .75rem 1rem }
dl div { display: flex; justify-content: space-between; gap: 1rem }
dt, dd { margin: 0; overflow-wrap: anywhere }
dd { font-variant-numeric: tabular-nums; white-space: nowrap }
.total { font-weight: 700; border-top: 1px solid var(--line); margin-top: .5rem; padding-top: .5rem }
.field { margin: 0 0 1rem }
.pair { display: grid; grid-template-columns: 1fr 1fr; gap: 1rem }
label { display: block; font-weight: 700 }
.hint { display: block; color: var(--soft); font-size: .9375rem }
input { width: 100%; min-height: 2.75rem; font: inherit; color: inherit; background: var(--sheet);
  border: 1px solid var(--line); border-radius: .25rem; padding: .5rem .75rem }
input[aria-invalid=true] { border: 2px solid var(--warn) }
.wrong { display: block; color: var(--warn); font-weight: 700 }
.problem { border: 2px solid var(--warn); background: var(--sheet); padding: .75rem 1rem; margin: 0 0 1.5rem }
.problem p { margin: 0 }
button, .button { display: inline-block; min-height: 2.75rem; font: inherit; font-weight: 700; text-decoration: none;
  border: 2px solid var(--act); border-radius: .25rem; padding: .5rem 1.25rem; cursor: pointer;
  background: var(--act); color: #fff }
button.second { background: var(--sheet); color: var(--act) }
.acts { display: flex; flex-wrap: wrap; gap: 1rem; align-items: center }
a { color: var(--act) }
.acts a, footer a { display: inline-block; padding: .625rem 0 }
:focus-visible { outline: 3px solid #1f4fbf; outline-offset: 2px }
summary { cursor: pointer; padding: .625rem 0; font-weight: 700 }
.scroll { overflow-x: auto }
table { border-collapse: collapse; width: 100%; background: var(--sheet); font-size: .9375rem }
caption { text-align: left; font-weight: 700; font-size: 1.25rem; padding: 1.5rem 0 .5rem }
th, td { text-align: left; padding: .375rem .75rem; border: 1px solid var(--line); font-variant-numeric: tabular-nums }
.money { text-align: right; white-space: nowrap }
code { font-size: .9375rem; overflow-wrap: anywhere }
footer { color: var(--soft); font-size: .9375rem }
`

const styleHash = createHash('sha256').update(css).digest('base64')

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
        <style>
          ${new Html(css)}
        </style>
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
