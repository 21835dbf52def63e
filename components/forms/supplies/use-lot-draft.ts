import { useWatch } from 'react-hook-form'

import type { SupplySetting } from './supply-setting'
import type { SupplyTyping } from './supply-typing'
import type { ListingDraft } from '@/shared/contracts/listings'

/** What is typed so far, as it would be stored: what the judgements beside the fields are made from. */
export function useLotDraft({ readDraft }: SupplySetting): ListingDraft {
  return readDraft(useWatch<SupplyTyping>() as SupplyTyping)
}
