import { Router } from 'express'

import { readCaller } from '@/server/auth/read-caller'
import { admit } from '@/server/http/caller'
import { showCalendar } from '@/server/orders/show-calendar'
import { publicIdText } from '@/shared/contracts/values'
import { Problem } from '@/shared/api/problem'

/** Not an endpoint of the contracts: its answer is a file, which a browser or a calendar program opens by itself. */
export function calendarRoutes(): Router {
  const router = Router()
  router.get('/orders/:orderId/calendar.ics', async (req, res) => {
    const caller = await readCaller(req)
    res.locals.memberId = caller?.memberId
    admit(caller, 'member')
    const { orderId } = req.params
    if (!caller || !publicIdText.safeParse(orderId).success) throw new Problem('not-found')
    const { method, fileName, text } = await showCalendar(caller, orderId)
    res.setHeader('cache-control', 'no-store')
    res.setHeader('content-type', `text/calendar; charset=utf-8; method=${method}`)
    res.setHeader('content-disposition', `attachment; filename="${fileName}"`)
    res.send(Buffer.from(text, 'utf8'))
  })
  return router
}
