import { badParameter } from '../failure'

/** Form fields with their bracketed names kept whole: `line_items[0][quantity]` -> `1`. */
export type Form = ReadonlyMap<string, string>

export function parseForm(text: string): Form {
  const form = new Map<string, string>()
  const nextIndex = new Map<string, number>()
  for (const [name, value] of new URLSearchParams(text)) {
    if (!name.endsWith('[]')) {
      form.set(name, value)
      continue
    }
    const list = name.slice(0, -2)
    const index = nextIndex.get(list) ?? 0
    nextIndex.set(list, index + 1)
    form.set(`${list}[${index}]`, value)
  }
  return form
}

/** `a[0][b]` -> `['a', '0', 'b']` */
export function segmentsOf(name: string): string[] {
  return name.split(/[[\]]+/).filter(Boolean)
}

/** Null when absent or sent empty (an empty text unsets, as the processor has it). */
export function textOf(form: Form, name: string): string | null {
  return form.get(name) || null
}

export function requiredText(form: Form, name: string): string {
  const value = textOf(form, name)
  if (value === null) throw badParameter(name, `Missing required param: ${name}.`, 'parameter_missing')
  return value
}

export function integerOf(form: Form, name: string): number | null {
  const value = textOf(form, name)
  return value === null ? null : Number(value)
}

/** US cents; the smallest charge is 50 (processor's documentation on minimum amounts, from memory). */
export function chargeAmountOf(form: Form, name: string): number {
  const cents = Number(requiredText(form, name))
  if (cents < 50) throw badParameter(name, 'Amount must be at least 50 cents.', 'amount_too_small')
  return cents
}

export function oneOf<T extends string>(form: Form, name: string, allowed: readonly T[]): T | null {
  const value = textOf(form, name)
  if (value === null) return null
  const found = allowed.find((one) => one === value)
  if (!found) throw badParameter(name, `Invalid ${name}: must be one of ${allowed.join(', ')}`)
  return found
}

export function mapOf(form: Form, name: string): Record<string, string> {
  const map: Record<string, string> = {}
  for (const [key, value] of form) {
    const [head, inner, more] = segmentsUnder(key, name)
    if (head && inner === undefined && more === undefined && value !== '') map[head] = value
  }
  return map
}

export function listOf(form: Form, name: string): string[] {
  return Object.values(mapOf(form, name))
}

/** The indexes in use under a list of objects: `line_items[0][…]`, `line_items[1][…]` -> `['0', '1']`. */
export function indexesOf(form: Form, name: string): string[] {
  const found = new Set<string>()
  for (const key of form.keys()) {
    const [index] = segmentsUnder(key, name)
    if (index !== undefined) found.add(index)
  }
  return [...found]
}

function segmentsUnder(key: string, name: string): string[] {
  return key.startsWith(`${name}[`) ? segmentsOf(key.slice(name.length)) : []
}
