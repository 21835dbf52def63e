import type { Choice } from '@/components/ui/choice'
import type { Equation } from '@/shared/domain/equation'
import type { UnitSystem } from '@/shared/units/unit-system'

/** One figure that a calculator asks for. */
export interface Ask {
  id: string
  label: string
  hint?: string
  /** What stands in the field at first: an example that gives an answer. */
  start: Record<UnitSystem, string>
  suffix?: Record<UnitSystem, string>
  /** null: not readable. Canonical units: °C, g, mm, L, km, hours. */
  read: (text: string, units: UnitSystem) => number | null
}

export interface Choosing {
  id: string
  label: string
  choices: readonly Choice<string>[]
  start: string
}

export interface AnswerLine {
  label: string
  text: string
}

/** `lines`, the one that was asked for first; or why there is no answer. */
export type ToolAnswer = { lines: readonly AnswerLine[]; note?: string } | { refusal: string }

export interface Given {
  figures: Record<string, number>
  chosen: Record<string, string>
  units: UnitSystem
}

export interface Tool {
  id: string
  title: string
  /** One sentence: what it tells, and what for. */
  lead: string
  asks: readonly Ask[]
  choosing?: readonly Choosing[]
  equations: readonly Equation[]
  answer: (given: Given) => ToolAnswer
  /** What it must not be taken for. */
  cautions: readonly string[]
}
