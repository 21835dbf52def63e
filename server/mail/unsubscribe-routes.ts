import { Router, type Response } from 'express'

import { now } from '@/server/clock'
import { readUnsubscribeToken } from '@/server/mail/unsubscribe-token'
import { PAGE_POLICY, unsubscribePage } from '@/server/mail/unsubscribe-page'
import { stopReminders } from '@/server/members/stop-reminders'

function send(res: Response, status: number, page: string): void {
  res.setHeader('content-security-policy', PAGE_POLICY)
  res.setHeader('cache-control', 'no-store')
  // The address carries the token: it goes nowhere else.
  res.setHeader('referrer-policy', 'no-referrer')
  res.status(status).type('html').send(page)
}

const forged = () =>
  unsubscribePage({
    heading: 'This link does not work',
    text: 'It may have been cut short in the mail. Nothing was changed. Under Me you can switch reminders off yourself.',
  })

/**
 * RFC 8058: mail programs POST here without cookies and from any origin, so it stands outside the origin check; the
 * signed token is the whole permission. A GET, which link scanners make too, only shows the button.
 */
export function unsubscribeRoutes(): Router {
  const router = Router()
  router.get('/unsubscribe/:token', (req, res) => {
    if (!readUnsubscribeToken(req.params.token)) return send(res, 404, forged())
    const page = unsubscribePage({
      heading: 'Stop reminders by mail?',
      text: 'You would no longer get mails before a pickup. What tells of your money or of a changed order still comes.',
      action: `/unsubscribe/${req.params.token}`,
    })
    send(res, 200, page)
  })
  router.post('/unsubscribe/:token', async (req, res) => {
    const leaving = readUnsubscribeToken(req.params.token)
    if (!leaving) return send(res, 404, forged())
    await stopReminders(leaving.memberId, now())
    const page = unsubscribePage({
      heading: 'Done: no more reminders by mail',
      text: 'You still find them under Notices. You can switch the mails on again under Me.',
    })
    send(res, 200, page)
  })
  return router
}
