// `npm run demo:code`: the second factor of each demo staff account, as their phone would show it now.
import path from 'node:path'
import { parseArgs } from 'node:util'

import { readDemoPeople } from './demo-people.mjs'
import { DATA } from './project-root.mjs'
import { tell } from './tell.mjs'
import { bytesOfBase32, timeCode } from './time-code.mjs'

const PERIOD_SECONDS = 30

const { values } = parseArgs({ options: { data: { type: 'string', default: DATA } } })
if (process.env.NODE_ENV === 'production') {
  tell('Demo codes are for local work only.')
  process.exit(1)
}
const staff = (await readDemoPeople(path.resolve(values.data))).filter((one) => one.totpSecret)
if (staff.length === 0) {
  tell('There are no demo people with a second factor yet: npm start makes them.')
  process.exit(1)
}
const nowSeconds = Date.now() / 1_000
for (const { email, role, totpSecret = '' } of staff) {
  tell(`${timeCode(bytesOfBase32(totpSecret), nowSeconds)}  ${email} (${role})`)
}
tell(`Good for ${Math.ceil(PERIOD_SECONDS - (nowSeconds % PERIOD_SECONDS))} more seconds.`)
