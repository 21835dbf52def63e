import { mediaCautions } from './media-facts'
import type { SupplyBody } from './supply-body'

import type { Caution } from '@/components/rules/caution-list'
import { adviseHolding } from '@/shared/domain/produce/judge-holding'
import { findCrop } from '@/shared/domain/produce/find-crop'
import { cautionTexts } from '@/shared/domain/rules/caution-texts.facts'

/** What stands under a listing of worms, media or produce that no legal gate speaks of. */
export function supplyCautions(body: SupplyBody): Caution[] {
  const meeting = (['G-12', 'G-13'] as const).map((id) => ({ id, text: cautionTexts[id] }))
  if (body.category === 'worms') return meeting
  if (body.category === 'media') {
    return [...mediaCautions(body).map((text, at) => ({ id: `media-${at}`, text })), ...meeting]
  }
  const crop = findCrop(body.cropId)
  const kept = crop ? adviseHolding({ crop, form: body.form, ...body.handling }) : []
  return [
    { id: 'G-9', text: cautionTexts['G-9'] },
    ...kept.map((text, at) => ({ id: `kept-${at}`, text })),
    ...meeting,
  ]
}
