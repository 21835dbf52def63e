import { batchFigures } from './batch-figures'

import type { BatchTyping } from './batch-typing'
import type { ListingDraft } from '@/shared/contracts/listings'
import type { UnitSystem } from '@/shared/units/unit-system'

interface Options {
  /** The draft the form was filled from: a figure nobody touched keeps its exact value. */
  was: ListingDraft
  units: UnitSystem
}

const answers: Record<string, boolean> = { yes: true, no: false }
// Texts the contract asks for in words of its own: sent empty, so that those words come back.
const askedTexts = ['words', 'health.treatments', 'health.lastLosses', 'licenceNumbers', 'promise.evidence']

/** The form's words as the draft that is stored: figures inside units; words that are no figure stay as typed. */
export function draftFromTyping(typing: BatchTyping, { was, units }: Options): ListingDraft {
  const { shipping, ...others } = typing
  const { isOffered, ...way } = shipping
  const typed = isOffered ? { ...others, shipping: way } : others
  const draft = unwind({ typed, was, path: '', units }) as ListingDraft
  return { category: 'fish', ...draft }
}

interface Layer {
  typed: unknown
  was: unknown
  path: string
  units: UnitSystem
}

function unwind({ typed, was, path, units }: Layer): unknown {
  if (typeof typed === 'string') return unwindText({ typed, was, path, units })
  if (Array.isArray(typed)) {
    const before: unknown[] = Array.isArray(was) ? was : []
    return typed.map((row: unknown, at) => unwind({ typed: row, was: before[at], path, units }))
  }
  if (typeof typed !== 'object' || typed === null) return typed
  const before = (typeof was === 'object' && was !== null ? was : {}) as Record<string, unknown>
  const parts = Object.entries(typed).map(([key, part]: [string, unknown]): [string, unknown] => [
    key,
    unwind({ typed: part, was: before[key], path: path ? `${path}.${key}` : key, units }),
  ])
  return Object.fromEntries(parts.filter(([, part]) => part !== undefined))
}

function unwindText({ typed, was, path, units }: Layer & { typed: string }): unknown {
  const text = typed.trim()
  if (text === '') return askedTexts.includes(path) ? '' : undefined
  if (path === 'wildCaught') return answers[text]
  const figure = batchFigures[path]
  if (!figure) return typed
  if (typeof was === 'number' && figure.print(was, units) === text) return was
  return figure.read(text, units) ?? text
}
