import { badParameter } from '../failure'
import { presentLine } from '../objects/checkout-session'
import { presentList } from '../objects/list'
import { presentById } from '../objects/present-by-id'
import { presentRefund } from '../objects/refund'
import type { Turn } from '../turn'

type Json = boolean | null | number | string | Json[] | { [name: string]: Json }
type JsonObject = { [name: string]: Json }

function plain(object: object): Json {
  return JSON.parse(JSON.stringify(object))
}

function isObject(value: Json | undefined): value is JsonObject {
  return typeof value === 'object' && value !== null && !Array.isArray(value)
}

/** Parts left out unless asked for: the lines of a page, the refunds of a charge. */
function includable(turn: Turn, holder: JsonObject, name: string): Json | undefined {
  const id = String(holder.id)
  if (holder.object === 'checkout.session' && name === 'line_items') {
    const lines = turn.draft.get('sessions', id)?.lines ?? []
    return plain(presentList(`/v1/checkout/sessions/${id}/line_items`, lines.map(presentLine)))
  }
  if (holder.object === 'charge' && name === 'refunds') {
    const refunds = turn.draft.all('refunds').filter((row) => row.chargeId === id)
    const shown = refunds.reverse().map((row) => presentRefund(turn, row))
    return plain(presentList(`/v1/charges/${id}/refunds`, shown))
  }
  return undefined
}

function expandOne(turn: Turn, holder: JsonObject, names: string[]): void {
  const [name, ...rest] = names
  if (name === undefined) return
  const here = Object.hasOwn(holder, name) ? holder[name] : includable(turn, holder, name)
  if (here === undefined) {
    throw badParameter('expand', `This property cannot be expanded (${name}).`)
  }
  const found = typeof here === 'string' ? presentById(turn, here) : null
  const value = found ? plain(found) : here
  if (typeof value !== 'object') throw badParameter('expand', `This property cannot be expanded (${name}).`)
  holder[name] = value
  for (const inner of Array.isArray(value) ? value : [value])
    if (isObject(inner)) expandOne(turn, inner, rest)
}

/** `latest_charge.balance_transaction`, or `data.latest_charge` on a list. */
export function expand(turn: Turn, answer: object, paths: string[]): object {
  const whole = plain(answer)
  if (!isObject(whole)) return answer
  for (const path of paths) expandOne(turn, whole, path.split('.'))
  return whole
}
