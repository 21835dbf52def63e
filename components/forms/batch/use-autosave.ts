import { useEffect, useEffectEvent } from 'react'
import type { FieldValues, UseFormReturn } from 'react-hook-form'

import type { DraftKeeper } from '@/hooks/draft-keeper'
import type { ListingDraft } from '@/shared/contracts/listings'

interface Saving<T extends FieldValues> {
  form: UseFormReturn<T>
  keeper: DraftKeeper
  readDraft: (typing: T) => ListingDraft
}

/** Hands every change of the form to the keeper; what changed nothing is not sent. */
export function useAutosave<T extends FieldValues>({ form, keeper, readDraft }: Saving<T>) {
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
