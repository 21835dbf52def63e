import type { Crop } from '@/shared/domain/produce/crop'
import { crops } from '@/shared/domain/produce/crops.facts'
import { findCrop, matchCrop } from '@/shared/domain/produce/find-crop'
import { judgeWords } from '@/shared/domain/produce/judge-words'
import { normaliseName } from '@/shared/domain/species/normalise-name'

const most = 8

/** Offered in one tap while nothing is typed: what stands on most rafts. */
const usual = ['leaf_lettuce', 'basil', 'kale', 'bok_choy', 'chard', 'microgreens']

export const usualCrops = (): Crop[] => usual.flatMap((id) => findCrop(id) ?? [])

/** Crops whose name, or another name, holds what was typed; those that begin with it first. 'kangkong' finds its plant. */
export function cropChoices(typed: string): Crop[] {
  const wanted = normaliseName(typed)
  if (wanted === '') return []
  const ranked = crops
    .map((crop) => ({ crop, rank: rankOf([crop.name, ...crop.alsoCalled].map(normaliseName), wanted) }))
    .filter(({ rank }) => rank < 3)
    .sort((a, b) => a.rank - b.rank || a.crop.name.localeCompare(b.crop.name, 'en'))
    .map(({ crop }) => crop)
  const named = matchCrop(typed)
  return (named && !ranked.includes(named) ? [named, ...ranked] : ranked).slice(0, most)
}

/** What to say when no crop of the list holds what was typed; sprouts are no oversight. */
export function whyNoCrop(typed: string): string {
  const found = judgeWords(typed, { organic: null, form: 'whole', taxonId: null })
  return (
    found.find(({ rule }) => rule === 'sprouts')?.saying ??
    'Not in our list yet. Try another name, or ask us to add it.'
  )
}

function rankOf(names: readonly string[], wanted: string): number {
  return Math.min(
    ...names.map((name) =>
      name === wanted ? 0 : name.startsWith(wanted) ? 1 : name.includes(wanted) ? 2 : 3,
    ),
  )
}
