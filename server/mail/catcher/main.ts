// A program of its own: catches the mail that the product sends on this machine, and shows it.
import { once } from 'node:events'
import { parseArgs } from 'node:util'

import { openMailBox } from './mail-box'
import { pageServer } from './page-server'
import { receiveMail } from './receive-mail'

const HOST = '127.0.0.1'
const { values } = parseArgs({
  options: {
    'smtp-port': { type: 'string', default: '8025' },
    'page-port': { type: 'string', default: '8026' },
    folder: { type: 'string', default: '.data/mail' },
  },
})

const box = await openMailBox(values.folder)
const smtp = receiveMail(box)
const pages = pageServer(box)
smtp.on('error', (error: Error) => process.stderr.write(`${error.message}\n`))
await Promise.all([
  once(smtp.listen(Number(values['smtp-port']), HOST), 'listening'),
  once(pages.listen(Number(values['page-port']), HOST), 'listening'),
])
process.stdout.write(
  `mail to ${HOST}:${values['smtp-port']} is shown on http://${HOST}:${values['page-port']}\n`,
)

for (const signal of ['SIGINT', 'SIGTERM'] as const) {
  process.once(signal, () => {
    pages.close()
    pages.closeAllConnections()
    smtp.close(() => process.exit(0))
  })
}
