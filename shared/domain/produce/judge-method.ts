import type { SaleUnitKind } from '@/shared/domain/listings/sale-unit'
import type { Crop } from '@/shared/domain/produce/crop'

const methodWords: Partial<Record<SaleUnitKind, string>> = {
  each: 'by the piece',
  head: 'by the head',
  bunch: 'by the bunch',
  weight: 'by net weight',
  'dry-pint': 'by the dry pint',
}

function orList(words: readonly string[]): string {
  const last = words.at(-1) ?? ''
  return words.length < 2 ? last : `${words.slice(0, -1).join(', ')} or ${last}`
}

/** 'by net weight, or by the bunch with its net weight on it': the ways a crop is sold here. */
export function methodsInWords(crop: Crop): string {
  return orList(
    crop.soldBy.map((kind) => {
      const words = methodWords[kind] ?? kind
      return kind === 'bunch' && crop.bunchNeedsWeight ? `${words} with its net weight` : words
    }),
  )
}

/**
 * Why a crop cannot be sold by this unit: kale 'per bag' is asked for a net weight or a bunch. `kind` is what was
 * asked for, known or not. null: it can.
 */
export function methodFault(crop: Crop, unit: { kind: string; netG?: number | undefined }): string | null {
  const isSoldSo = crop.soldBy.some((kind) => kind === unit.kind)
  if (!isSoldSo) {
    const start = methodWords[unit.kind as SaleUnitKind]
      ? ''
      : `A ${unit.kind} does not say how much is in it. `
    return `${start}${crop.name}: sell ${methodsInWords(crop)}.`
  }
  if (unit.kind === 'bunch' && crop.bunchNeedsWeight && unit.netG === undefined) {
    return `${crop.name}: bunches differ, so write the least net weight of one bunch too, like 6 oz.`
  }
  return null
}
