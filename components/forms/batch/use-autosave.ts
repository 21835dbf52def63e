import { useEffect, useEffectEvent } from 'react'
import type { UseFormReturn } from 'react-hook-form'

import type { BatchTyping } from './batch-typing'
import type { DraftKeeper } from '@/hooks/draft-keeper'
import type { ListingDraft } from '@/shared/contracts/listings'

interface Saving {
  form: UseFormReturn<BatchTyping>
  keeper: DraftKeeper
  readDraft: (typing: BatchTyping) => ListingDraft
}

/** Hands every change of the form to the keeper; what changed nothing is not sent. */
export function useAutosave({ form, keeper, readDraft }: Saving) {
  const asDraft = useEffectEvent(readDraft)
  useEffect(() => {
    let last = JSON.stringify(asDraft(form.getValues()))
    return form.subscribe({
      formState: { values: true },
      callback: ({ values }) => {
        const draft = asDraft(values)
        const text = JSON.stringify(draft)
        if (text === last) return
        last = text
        keeper.type(draft)
      },
    })
  }, [form, keeper])
}
