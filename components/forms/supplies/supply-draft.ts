import { overlayDraft } from '@/components/forms/overlay-draft'
import { unwindTyping } from '@/components/forms/unwind-typing'

import { supplyBlank } from './supply-blank'
import { supplyFigures } from './supply-figures'

import type { SupplyKind } from './supply-kind'
import type { SupplyTyping } from './supply-typing'
import type { ListingDraft } from '@/shared/contracts/listings'
import type { OwnSeller } from '@/shared/contracts/sellers'
import type { UnitSystem } from '@/shared/units/unit-system'

const yesNo = [
  'handling.rinsedInDrinkingWater',
  'handling.coldAtPickup',
  'raisedInUs',
  'wildCaught',
  'rinsed',
]
const emptyRows = {
  tiers: { fromCount: '', unitCents: '' },
  windows: { day: '', from: '', until: '', capacity: '' },
  photos: { photoId: '', takenOn: '', hasRuler: false, caption: '' },
  statesServed: '',
}
const partsOfUnit: Record<string, readonly string[]> = {
  weight: ['netG'],
  bunch: ['netG'],
  pack: ['count'],
  volume: ['litres', 'weightKg'],
}

/** A stored draft as its form shows it. */
export function supplyTypingOf(kind: SupplyKind, draft: ListingDraft, units: UnitSystem): SupplyTyping {
  return overlayDraft(supplyBlank(kind), draft, { units, figures: supplyFigures, emptyRows })
}

interface Options {
  kind: SupplyKind
  was: ListingDraft
  units: UnitSystem
  farm: OwnSeller
}

/** The form's words as the draft that is stored. */
export function supplyDraftOf(typing: SupplyTyping, { kind, was, units, farm }: Options): ListingDraft {
  const reading = { was, units, figures: supplyFigures, yesNo, askedTexts: ['words'] }
  const draft = unwindTyping({ ...typing, saleUnit: unitTyped(typing.saleUnit) }, reading)
  if (draft.standing !== 'qualified-exempt') return { category: kind, ...draft }
  const { farmName, street, city, state, zip } = farm
  return { category: kind, ...draft, farm: { name: farmName, street, city, state, zip } }
}

/** A weight typed before the grower chose "by the head" is kept in the form and left out of the draft. */
function unitTyped(unit: SupplyTyping['saleUnit']) {
  const asked = ['kind', ...(partsOfUnit[unit.kind] ?? [])]
  return Object.fromEntries(Object.entries(unit).filter(([part]) => asked.includes(part)))
}
