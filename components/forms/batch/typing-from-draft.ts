import { batchFigures } from './batch-figures'

import type { BatchTyping } from './batch-typing'
import type { ListingDraft } from '@/shared/contracts/listings'
import type { UnitSystem } from '@/shared/units/unit-system'

interface Options {
  /** Stands where the draft says nothing. */
  base: BatchTyping
  units: UnitSystem
}

const emptyRows: Record<string, unknown> = {
  tiers: { fromCount: '', unitCents: '' },
  windows: { day: '', from: '', until: '', capacity: '' },
  photos: { photoId: '', takenOn: '', hasRuler: false, caption: '' },
  statesServed: '',
  'shipping.days': '',
}

/** A stored draft as the form shows it: figures printed in the seller's units, unreadable words as they were typed. */
export function typingFromDraft(draft: ListingDraft, { base, units }: Options): BatchTyping {
  const { shipping } = draft
  // The switch is no answer of its own: a draft that says how it is shipped is shipped.
  const isOffered = typeof shipping === 'object' && shipping !== null
  const given = isOffered ? { ...draft, shipping: { ...shipping, isOffered } } : draft
  return overlay({ base, given, path: '', units }) as BatchTyping
}

interface Layer {
  base: unknown
  given: unknown
  path: string
  units: UnitSystem
}

function overlay({ base, given, path, units }: Layer): unknown {
  if (given === undefined || given === null) return base
  if (typeof base === 'string')
    return overlayText(base, given, (value) => batchFigures[path]?.print(value, units))
  if (typeof base === 'boolean') return typeof given === 'boolean' ? given : base
  if (Array.isArray(base)) {
    if (!Array.isArray(given)) return base
    return given.map((row: unknown) => overlay({ base: emptyRows[path], given: row, path, units }))
  }
  if (typeof base !== 'object' || base === null || typeof given !== 'object') return base
  const parts = given as Record<string, unknown>
  return Object.fromEntries(
    Object.entries(base).map(([key, part]: [string, unknown]) => [
      key,
      overlay({ base: part, given: parts[key], path: path ? `${path}.${key}` : key, units }),
    ]),
  )
}

function overlayText(base: string, given: unknown, print: (value: number) => string | undefined): string {
  if (typeof given === 'string') return given
  if (typeof given === 'number') return print(given) ?? String(given)
  if (typeof given === 'boolean') return given ? 'yes' : 'no'
  return base
}
