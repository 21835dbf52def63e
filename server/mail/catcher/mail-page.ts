import type { Mail } from './mail'
import { escapeHtml, pageFrame } from './page-frame'

const LINK = /https?:\/\/[^\s"'<>]+/g

/** Text with its web addresses made clickable. */
export function linkedText(text: string): string {
  let done = ''
  let at = 0
  for (const { 0: found, index } of text.matchAll(LINK)) {
    const link = found.replace(/[.,;:!?)\]}]+$/, '')
    done += `${escapeHtml(text.slice(at, index))}<a href="${escapeHtml(link)}">${escapeHtml(link)}</a>`
    at = index + link.length
  }
  return done + escapeHtml(text.slice(at))
}

function facts(mail: Mail): string {
  const rows: [string, string][] = [
    ['From', escapeHtml(mail.from)],
    ['To', escapeHtml(mail.to.join(', '))],
    [
      'Received',
      `<time datetime="${mail.receivedAt}">${mail.receivedAt.slice(0, 19).replace('T', ' ')} UTC</time>`,
    ],
  ]
  mail.attachments.forEach(({ name, type, bytes }, at) =>
    rows.push([
      'File',
      `<a href="/mails/${mail.id}/files/${at}">${escapeHtml(name)}</a> (${escapeHtml(type)}, ${bytes} bytes)`,
    ]),
  )
  return `<dl>${rows.map(([name, value]) => `<dt>${name}</dt><dd>${value}</dd>`).join('')}</dl>`
}

export function mailPage(mail: Mail): string {
  const picture = mail.html
    ? `<h2>As it looks</h2><iframe title="The mail as it looks" src="/mails/${mail.id}/html" sandbox="allow-popups allow-popups-to-escape-sandbox"></iframe>`
    : ''
  return pageFrame(
    mail.subject,
    `<header><nav aria-label="Mails"><a href="/">All mails</a> <a href="/mails/${mail.id}/raw">Source</a></nav></header>
<main><h1>${escapeHtml(mail.subject)}</h1>${facts(mail)}
<h2>Text</h2><pre>${linkedText(mail.text)}</pre>${picture}</main>`,
  )
}
