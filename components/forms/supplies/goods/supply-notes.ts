import { numberOf, partOf, textOf } from './read-part'

import type { ListingDraft } from '@/shared/contracts/listings'
import { findMedia } from '@/shared/domain/media/find-media'
import { carLoadWords, judgeStatedWeight } from '@/shared/domain/media/media-weight'
import { supplyPrice } from '@/shared/domain/pricing/supply-price'
import { heatCaution, type HeatAnswer } from '@/shared/domain/worms/heat-treated'
import { readUnit } from '@/shared/domain/listings/read-unit'
import { findWormKind } from '@/shared/domain/worms/find-worm-kind'
import { judgeWormLot } from '@/shared/domain/worms/judge-worm-lot'
import type { UnitSystem } from '@/shared/units/unit-system'

export interface MediaNotes {
  hasGrain: boolean
  mayCarryWorms: boolean
  /** '$40.00 for 50 L, $22.65/cu ft'. */
  price: string | null
  /** What one unit weighs in the car. */
  load: string | null
  /** A weight or volume that hardly can be. */
  weight: string | null
  heat: string | null
}

const litresOf = (draft: ListingDraft) => numberOf(draft, 'saleUnit.litres')
const priceOf = (draft: ListingDraft) => numberOf(partOf(draft, 'tiers.0'), 'unitCents')

/** Beside the fields of media, by the functions the server judges with. */
export function mediaNotes(draft: ListingDraft, units: UnitSystem): MediaNotes {
  const material = findMedia(textOf(draft, 'material'))
  const unit = readUnit(draft)
  const litres = litresOf(draft)
  const weightKg = unit?.kind === 'volume' ? unit.weightKg : unit?.kind === 'weight' ? unit.netG / 1000 : null
  const heat = textOf(draft, 'heatTreated') as HeatAnswer | ''
  return {
    hasGrain: material?.hasGrain ?? false,
    mayCarryWorms: material?.mayCarryWorms ?? false,
    price: printPrice(draft, units),
    load: weightKg === null ? null : carLoadWords(1, weightKg),
    weight:
      material && litres !== null && litres > 0 && weightKg !== null
        ? judgeStatedWeight(material, { litres, weightKg }).saying
        : null,
    heat: material && heat ? heatCaution(material, heat) : null,
  }
}

export interface WormNotes {
  many: string
  price: string | null
  /** Why it cannot be listed, at the field that says so. */
  refused: Partial<Record<'taxonId' | 'strain', string>>
  /** What a moderator reads first. */
  review: string[]
}

/** Beside the fields of worms, by the functions the server judges with. */
export function wormNotes(draft: ListingDraft, units: UnitSystem): WormNotes {
  const taxonId = textOf(draft, 'taxonId')
  const judged = judgeWormLot({
    taxonId,
    names: textOf(draft, 'strain'),
    words: textOf(draft, 'words'),
    raisedInUs: draft.raisedInUs !== false,
    lotChecked: true,
  })
  const refused = taxonId
    ? judged.reasons.filter(({ code }) => code === 'blocked' || code === 'not-a-worm')
    : []
  return {
    many: findWormKind(taxonId)?.many ?? 'worms',
    price: printPrice(draft, units),
    refused: Object.fromEntries(refused.map(({ field, saying }) => [field, saying])),
    review: judged.reasons
      .filter(({ code }) => code === 'not-raised-in-us' || code === 'words-name-blocked')
      .map(({ saying }) => saying),
  }
}

function printPrice(draft: ListingDraft, units: UnitSystem): string | null {
  const unit = readUnit(draft)
  const unitCents = priceOf(draft)
  if (unitCents === null || unitCents <= 0) return null
  if (unit?.kind !== 'pack' && unit?.kind !== 'weight' && unit?.kind !== 'volume') return null
  const { price, comparable } = supplyPrice({ unit, unitCents }, units)
  return comparable ? `${price}, ${comparable}` : price
}
