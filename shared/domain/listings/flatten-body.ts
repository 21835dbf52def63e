/** A listing's body as far as comparing goes: fields, and fields of their fields one level down. */
export type BodyFields = Record<string, unknown>

const isGroup = (value: unknown): value is BodyFields =>
  typeof value === 'object' && value !== null && !Array.isArray(value)

/** 'water.pH' beside 'tiers': one entry for each answer; lists stay whole. */
export function flattenBody(body: BodyFields): Map<string, unknown> {
  const flat = new Map<string, unknown>()
  for (const [field, value] of Object.entries(body)) {
    if (!isGroup(value)) flat.set(field, value)
    else for (const [inner, answer] of Object.entries(value)) flat.set(`${field}.${inner}`, answer)
  }
  return flat
}

const plain = (value: unknown) => JSON.stringify(value, sortedKeys)

function sortedKeys(_key: string, value: unknown): unknown {
  if (!isGroup(value)) return value
  return Object.fromEntries(Object.entries(value).sort(([a], [b]) => (a < b ? -1 : 1)))
}

/** Names of the answers that differ between two bodies, in the order of the later one. */
export function changedFields(before: BodyFields, after: BodyFields): string[] {
  const was = flattenBody(before)
  const is = flattenBody(after)
  const names = new Set([...is.keys(), ...was.keys()])
  return [...names].filter((name) => plain(was.get(name)) !== plain(is.get(name)))
}
