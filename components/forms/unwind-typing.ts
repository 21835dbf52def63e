import type { Figure } from '@/components/forms/figure'
import type { UnitSystem } from '@/shared/units/unit-system'

interface Reading {
  /** The draft the form was filled from: a figure nobody touched keeps its exact value. */
  was: unknown
  units: UnitSystem
  /** By field, rows of a list without their number. */
  figures: Readonly<Record<string, Figure>>
  /** Fields whose words 'yes' and 'no' stand for true and false. */
  yesNo: readonly string[]
  /** Texts the contract asks for in words of its own: sent empty, so that those words come back. */
  askedTexts: readonly string[]
}

/** A form's words as they are stored: figures inside units; words that are no figure stay as typed. */
export function unwindTyping(typed: object, reading: Reading): Record<string, unknown> {
  return unwind(typed, { ...reading, path: '' }) as Record<string, unknown>
}

interface Layer extends Reading {
  path: string
}

const answers: Record<string, boolean> = { yes: true, no: false }

function unwind(typed: unknown, layer: Layer): unknown {
  if (typeof typed === 'string') return unwindText(typed, layer)
  const { was, path } = layer
  if (Array.isArray(typed)) {
    const before: unknown[] = Array.isArray(was) ? was : []
    return typed.map((row: unknown, at) => unwind(row, { ...layer, was: before[at] }))
  }
  if (typeof typed !== 'object' || typed === null) return typed
  const before = (typeof was === 'object' && was !== null ? was : {}) as Record<string, unknown>
  const parts = Object.entries(typed).map(([key, part]: [string, unknown]): [string, unknown] => [
    key,
    unwind(part, { ...layer, was: before[key], path: path ? `${path}.${key}` : key }),
  ])
  return Object.fromEntries(parts.filter(([, part]) => part !== undefined))
}

function unwindText(typed: string, { was, path, units, figures, yesNo, askedTexts }: Layer): unknown {
  const text = typed.trim()
  if (text === '') return askedTexts.includes(path) ? '' : undefined
  if (yesNo.includes(path)) return answers[text]
  const figure = figures[path]
  if (!figure) return typed
  if (typeof was === 'number' && figure.print(was, units) === text) return was
  return figure.read(text, units) ?? text
}
