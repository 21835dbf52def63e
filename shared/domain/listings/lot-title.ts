import { listingTitle } from '@/shared/domain/listings/listing-title'
import { findMedia } from '@/shared/domain/media/find-media'
import { findCrop } from '@/shared/domain/produce/find-crop'
import type { ProduceForm } from '@/shared/domain/produce/judge-form'
import { findTaxon } from '@/shared/domain/species/find-taxon'

/** A listing as far as its name goes. */
export type NamedLot =
  | { category: 'fish'; taxonId: string; strain?: string | undefined; stage: string }
  | { category: 'worms'; taxonId: string; strain?: string | undefined }
  | {
      category: 'media'
      material: string
      materialWords?: string | undefined
      used: string
    }
  | { category: 'produce'; cropId: string; variety?: string | undefined; form: string }

const formWords: Record<ProduceForm, string> = {
  whole: '',
  'harvest-cut': 'cut leaves',
  'cut-mixed-or-washed': 'ready to eat',
}
const isForm = (form: string): form is ProduceForm => form in formWords

const named = (name: string, apart: string | undefined, after = '') =>
  [name, apart ? `(${apart})` : '', after].filter(Boolean).join(' ')

/** 'Nile tilapia fingerlings', 'Red wiggler', 'Expanded clay, used', 'Leaf lettuce (Salanova), cut leaves'. */
export function lotTitle(lot: NamedLot): string {
  switch (lot.category) {
    case 'fish':
      return listingTitle(lot)
    case 'worms':
      return named(findTaxon(lot.taxonId)?.commonName ?? 'Worms', lot.strain)
    case 'media': {
      const material = findMedia(lot.material)
      const name = lot.material === 'other' ? undefined : material?.name
      const title = named(name ?? lot.materialWords ?? 'Media', name && lot.materialWords)
      return lot.used === 'used' ? `${title}, used` : title
    }
    case 'produce': {
      const form = isForm(lot.form) ? formWords[lot.form] : ''
      const title = named(findCrop(lot.cropId)?.name ?? 'Produce', lot.variety)
      return form ? `${title}, ${form}` : title
    }
  }
}
