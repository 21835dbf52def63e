import { unwindTyping } from '@/components/forms/unwind-typing'

import { batchFigures } from './batch-figures'

import type { BatchTyping } from './batch-typing'
import type { ListingDraft } from '@/shared/contracts/listings'
import type { UnitSystem } from '@/shared/units/unit-system'

interface Options {
  /** The draft the form was filled from: a figure nobody touched keeps its exact value. */
  was: ListingDraft
  units: UnitSystem
}

const askedTexts = ['words', 'health.treatments', 'health.lastLosses', 'licenceNumbers', 'promise.evidence']

/** The form's words as the draft that is stored: figures inside units; words that are no figure stay as typed. */
export function draftFromTyping(typing: BatchTyping, { was, units }: Options): ListingDraft {
  const { shipping, ...others } = typing
  const { isOffered, ...way } = shipping
  const typed = isOffered ? { ...others, shipping: way } : others
  const draft = unwindTyping(typed, { was, units, figures: batchFigures, yesNo: ['wildCaught'], askedTexts })
  return { category: 'fish', ...draft }
}
