import type { Mail } from './mail'
import { escapeHtml, pageFrame } from './page-frame'

const row = ({ id, subject, to, receivedAt }: Mail): string =>
  `<li><a href="/mails/${id}"><strong>${escapeHtml(subject)}</strong>
<small>to ${escapeHtml(to.join(', '))}, <time datetime="${receivedAt}">${receivedAt.slice(0, 19).replace('T', ' ')} UTC</time></small></a></li>`

/** `mails` are the newest, `count` is how many there are in all. */
export function listPage(mails: Mail[], count: number): string {
  const what =
    count === 0
      ? '<p>No mail yet. Everything the product sends arrives here; reload to look again.</p>'
      : `<p>${count === 1 ? '1 mail' : `${count} mails`}, newest first. Nothing here has left this machine.</p>`
  const more = mails.length < count ? `<p>Only the newest ${mails.length} are listed.</p>` : ''
  const list = mails.length > 0 ? `<ol>${mails.map(row).join('\n')}</ol>` : ''
  return pageFrame('Caught mail', `<main><h1>Caught mail</h1>${what}${list}${more}</main>`)
}
