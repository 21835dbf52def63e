import { createServer, type IncomingMessage, type Server, type ServerResponse } from 'node:http'

import { simpleParser } from 'mailparser'

import { listPage } from './list-page'
import type { MailBox } from './mail-box'
import { mailPage } from './mail-page'
import { pageFrame, STYLE } from './page-frame'

const LISTED = 200
const PAGE_POLICY =
  "default-src 'none'; style-src 'self'; frame-src 'self'; base-uri 'none'; form-action 'none'"
// A mail may bring any markup: no scripts, no forms, its links open beside it.
const MAIL_POLICY =
  "sandbox allow-popups allow-popups-to-escape-sandbox; default-src 'none'; style-src 'unsafe-inline'; img-src data: http: https:"

interface Answer {
  status?: number
  type: string
  body: string | Buffer
  policy?: string
  fileName?: string
}

const page = (body: string, status = 200): Answer => ({ status, type: 'text/html; charset=utf-8', body })
const nothing = () =>
  page(
    pageFrame('Not here', '<main><h1>There is no such mail</h1><p><a href="/">All mails</a></p></main>'),
    404,
  )

/** Links of the mail open in a new tab. */
const withLinksBeside = (html: string): string =>
  /<head[^>]*>/i.test(html)
    ? html.replace(/<head[^>]*>/i, (head) => `${head}<base target="_blank">`)
    : `<!doctype html><base target="_blank">${html}`

async function mailAnswer(box: MailBox, id: string, rest: string[]): Promise<Answer> {
  const mail = await box.find(id)
  const raw = await box.raw(id)
  if (!mail || !raw) return nothing()
  const [part, number] = rest
  if (part === undefined) return page(mailPage(mail))
  if (part === 'raw') return { type: 'text/plain; charset=utf-8', body: raw }
  if (part === 'html' && mail.html) {
    return { ...page(withLinksBeside(mail.html)), policy: MAIL_POLICY }
  }
  const file = part === 'files' ? (await simpleParser(raw)).attachments[Number(number)] : undefined
  if (!file) return nothing()
  return {
    type: file.contentType,
    body: file.content,
    fileName: file.filename ?? 'part',
    policy: MAIL_POLICY,
  }
}

async function answerTo(box: MailBox, request: IncomingMessage): Promise<Answer> {
  const url = new URL(request.url ?? '/', 'http://127.0.0.1')
  const [place = '', id = '', ...rest] = url.pathname.split('/').slice(1)
  if (url.pathname === '/api/messages' && request.method === 'DELETE') {
    await box.clear()
    return { status: 204, type: 'application/json', body: '' }
  }
  if (request.method !== 'GET')
    return { status: 405, type: 'text/plain', body: 'Only GET, and DELETE /api/messages' }
  if (url.pathname === '/') return page(listPage(await box.list({ atMost: LISTED }), box.count()))
  if (url.pathname === '/api/messages') {
    const mails = await box.list({ to: url.searchParams.get('to') ?? undefined })
    return { type: 'application/json', body: JSON.stringify(mails) }
  }
  if (url.pathname === '/style.css') return { type: 'text/css', body: STYLE }
  if (url.pathname === '/healthz') return { type: 'text/plain', body: 'ok' }
  return place === 'mails' ? mailAnswer(box, id, rest) : nothing()
}

function send(
  response: ServerResponse,
  { status = 200, type, body, policy = PAGE_POLICY, fileName }: Answer,
) {
  response.writeHead(status, {
    'content-type': type,
    'content-security-policy': policy,
    'x-content-type-options': 'nosniff',
    'cache-control': 'no-store',
    ...(fileName
      ? { 'content-disposition': `attachment; filename*=UTF-8''${encodeURIComponent(fileName)}` }
      : {}),
  })
  response.end(body)
}

/** The pages for people and `/api/messages` for tests. */
export function pageServer(box: MailBox): Server {
  return createServer((request, response) => {
    answerTo(box, request).then(
      (answer) => send(response, answer),
      (error: unknown) => send(response, { status: 500, type: 'text/plain', body: String(error) }),
    )
  })
}
