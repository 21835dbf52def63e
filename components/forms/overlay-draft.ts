import type { Figure } from '@/components/forms/figure'
import type { UnitSystem } from '@/shared/units/unit-system'

interface Showing {
  units: UnitSystem
  figures: Readonly<Record<string, Figure>>
  /** What a row of each list looks like with nothing in it. */
  emptyRows: Readonly<Record<string, unknown>>
}

/** A stored draft as a form shows it, over what stands where the draft says nothing; unreadable words as typed. */
export function overlayDraft<T extends object>(base: T, given: unknown, showing: Showing): T {
  return overlay(base, given, { ...showing, path: '' }) as T
}

interface Layer extends Showing {
  path: string
}

function overlay(base: unknown, given: unknown, layer: Layer): unknown {
  const { path, units, figures, emptyRows } = layer
  if (given === undefined || given === null) return base
  if (typeof base === 'string') return overlayText(base, given, (value) => figures[path]?.print(value, units))
  if (typeof base === 'boolean') return typeof given === 'boolean' ? given : base
  if (Array.isArray(base)) {
    if (!Array.isArray(given)) return base
    return given.map((row: unknown) => overlay(emptyRows[path], row, layer))
  }
  if (typeof base !== 'object' || base === null || typeof given !== 'object') return base
  const parts = given as Record<string, unknown>
  return Object.fromEntries(
    Object.entries(base).map(([key, part]: [string, unknown]) => [
      key,
      overlay(part, parts[key], { ...layer, path: path ? `${path}.${key}` : key }),
    ]),
  )
}

function overlayText(base: string, given: unknown, print: (value: number) => string | undefined): string {
  if (typeof given === 'string') return given
  if (typeof given === 'number') return print(given) ?? String(given)
  if (typeof given === 'boolean') return given ? 'yes' : 'no'
  return base
}
