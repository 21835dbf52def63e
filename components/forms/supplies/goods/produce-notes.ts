import { numberOf, partOf, textOf } from './read-part'

import type { ListingDraft } from '@/shared/contracts/listings'
import { readUnit } from '@/shared/domain/listings/read-unit'
import type { SaleUnitKind } from '@/shared/domain/listings/sale-unit'
import type { Crop } from '@/shared/domain/produce/crop'
import { judgeStanding, type FarmAddress, type FarmStanding } from '@/shared/domain/produce/farm-standing'
import { findCrop } from '@/shared/domain/produce/find-crop'
import { judgeForm, type ProduceForm } from '@/shared/domain/produce/judge-form'
import { adviseHolding, type WaterTouch } from '@/shared/domain/produce/judge-holding'
import { judgeWords, type OrganicClaim } from '@/shared/domain/produce/judge-words'
import { nextLotCode } from '@/shared/domain/produce/lot-code'
import { sellBy } from '@/shared/domain/produce/sell-by'
import { unitPrice, type UnitPrice } from '@/shared/domain/produce/unit-price'
import type { UnitSystem } from '@/shared/units/unit-system'

/** What is judged beside the fields while they are filled, by the functions the server judges with. */
export interface ProduceNotes {
  /** Lawful ways to sell the crop, the usual one first; [] until a crop is picked. */
  methods: readonly SaleUnitKind[]
  bunchNeedsWeight: boolean
  price: UnitPrice | null
  /** Last day of sale, YYYY-MM-DD. null: nobody published how long it keeps like this, or not enough is answered. */
  sellByDay: string | null
  /** True: nobody published it, so the grower must say. */
  mustSaySellBy: boolean
  lotCode: string | null
  /** What must stand on bag or label. */
  label: string | null
  /** Why it is held until a moderator has looked. */
  held: string | null
  /** Cold, chilling and fish water. */
  advice: string[]
  /** By field: what words claim that the answers do not carry. */
  words: Partial<Record<'variety' | 'growing' | 'words', string>>
  /** What the standing makes public. null: nothing. */
  shows: string | null
  standing: string | null
}

const nothing = null

export function produceNotes(draft: ListingDraft, farm: FarmAddress, units: UnitSystem): ProduceNotes {
  const crop = findCrop(textOf(draft, 'cropId'))
  const form = textOf(draft, 'form') as ProduceForm | ''
  const heldC = numberOf(draft, 'handling.heldC')
  const harvestDay = textOf(draft, 'harvest.day')
  const reckoned =
    crop && form && heldC !== null && harvestDay ? sellBy({ crop, form, harvestDay, heldC }) : null
  const judged = form ? judgeForm(form, false) : null
  const standing = textOf(draft, 'standing') as FarmStanding | ''
  const stood = standing ? judgeStanding(standing, standing === 'qualified-exempt' ? farm : null) : null
  return {
    methods: crop?.soldBy ?? [],
    bunchNeedsWeight: crop?.bunchNeedsWeight ?? false,
    price: crop ? priceOf(draft, crop, units) : nothing,
    sellByDay: reckoned?.day ?? null,
    mustSaySellBy: crop !== null && form !== '' && heldC !== null && harvestDay !== '' && !reckoned,
    lotCode: harvestDay ? nextLotCode(harvestDay, textOf(draft, 'harvest.bed') || null, []) : null,
    label: judged?.label ?? null,
    held: judged?.saying ?? null,
    advice: crop && form ? advise(draft, crop, form) : [],
    words: wordsOf(draft, crop, form || 'whole'),
    shows: stood?.shows ?? null,
    standing: stood?.fault ?? stood?.caution ?? null,
  }
}

function priceOf(draft: ListingDraft, crop: Crop, units: UnitSystem): UnitPrice | null {
  const unit = readUnit(draft)
  const unitCents = numberOf(partOf(draft, 'tiers.0'), 'unitCents')
  return unit && unitCents !== null && unitCents > 0 ? unitPrice({ crop, unit, unitCents }, units) : null
}

function advise(draft: ListingDraft, crop: Crop, form: ProduceForm): string[] {
  const heldC = numberOf(draft, 'handling.heldC')
  const touches = textOf(draft, 'handling.touchesSystemWater') as WaterTouch | ''
  if (heldC === null) return []
  return adviseHolding({
    crop,
    form,
    heldC,
    touchesSystemWater: touches || 'no',
    rinsedInDrinkingWater: partOf(draft, 'handling.rinsedInDrinkingWater') === true,
  })
}

function wordsOf(draft: ListingDraft, crop: Crop | null, form: ProduceForm): ProduceNotes['words'] {
  const organic = (textOf(draft, 'organic') || null) as OrganicClaim | null
  const fields = ['variety', 'growing', 'words'] as const
  return Object.fromEntries(
    fields.flatMap((field) => {
      const found = judgeWords(textOf(draft, field), { organic, form, taxonId: crop?.taxonId ?? null })
      return found.length > 0 ? [[field, found.map(({ saying }) => saying).join(' ')]] : []
    }),
  )
}
