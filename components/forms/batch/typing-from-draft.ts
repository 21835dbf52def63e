import { overlayDraft } from '@/components/forms/overlay-draft'

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
  return overlayDraft(base, given, { units, figures: batchFigures, emptyRows })
}
