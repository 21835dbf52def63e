import type { Given, Tool } from './tool'
import type { UnitSystem } from '@/shared/units/unit-system'

/** What was typed, by the id of its field; a field not yet touched shows its example. */
export type Typed = Readonly<Record<string, string>>

interface Reading {
  given: Given
  /** Fields whose text says no figure, with a sentence each. */
  faults: Record<string, string>
}

/** Reads every field of a calculator; figures that cannot be read are left out and named. */
export function readAsks(tool: Pick<Tool, 'asks' | 'choosing'>, typed: Typed, units: UnitSystem): Reading {
  const figures: Record<string, number> = {}
  const faults: Record<string, string> = {}
  for (const { id, start, read } of tool.asks) {
    const figure = read(typed[id] ?? start[units], units)
    if (figure === null || !Number.isFinite(figure)) faults[id] = `A figure, like ${start[units]}.`
    else figures[id] = figure
  }
  const chosen = Object.fromEntries(
    (tool.choosing ?? []).map(({ id, start }) => [id, typed[id] ?? start] as const),
  )
  return { given: { figures, chosen, units }, faults }
}
