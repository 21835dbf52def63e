import { SMTPServer } from 'smtp-server'

import type { MailBox } from './mail-box'

const LARGEST_BYTES = 20 * 1024 * 1024

/** Takes every mail for everybody and sends none on. Loopback only, so no sign-in and no TLS. */
export function receiveMail(box: MailBox): SMTPServer {
  return new SMTPServer({
    banner: 'mail catcher: nothing leaves this machine',
    authOptional: true,
    disabledCommands: ['STARTTLS', 'AUTH'],
    size: LARGEST_BYTES,
    closeTimeout: 500,
    onData(stream, session, done) {
      const parts: Buffer[] = []
      stream.on('data', (part: Buffer) => parts.push(part))
      stream.once('end', () => {
        const { mailFrom, rcptTo } = session.envelope
        const from = mailFrom === false ? '' : mailFrom.address
        if (stream.sizeExceeded) {
          done(Object.assign(new Error('the mail is larger than 20 MB'), { responseCode: 552 }))
          return
        }
        box.add(Buffer.concat(parts), { from, to: rcptTo.map((one) => one.address) }).then(
          () => done(),
          (error: Error) => done(Object.assign(error, { responseCode: 451 })),
        )
      })
    },
  })
}
