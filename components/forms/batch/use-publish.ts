import { useRef, useState } from 'react'
import type { FieldPath, FieldValues, UseFormReturn } from 'react-hook-form'

import { newRequestKey } from '@/hooks/request-key'
import { useSubmitListing } from '@/hooks/use-submit-listing'
import { NoAnswer } from '@/shared/api/call'
import { Problem } from '@/shared/api/problem'

import type { DraftKeeper } from '@/hooks/draft-keeper'
import type { OwnListing } from '@/shared/contracts/listings'

interface Publishing<T extends FieldValues> {
  form: UseFormReturn<T>
  keeper: DraftKeeper
  listingId: string
  /** The form's name for a place the server points at; null: no field of this form. */
  nameOf: (pointer: string) => FieldPath<T> | null
  onPublished: (own: OwnListing) => void
}

/** What stopped the publishing as a whole, beside the errors at the fields. */
export interface PublishTrouble {
  message: string
  needsPayouts: boolean
}

/** Checks, saves what waits, then publishes exactly the revision that was saved. */
export function usePublish<T extends FieldValues>(publishing: Publishing<T>) {
  const { form, keeper, listingId, nameOf, onPublished } = publishing
  const submit = useSubmitListing(listingId)
  const [attempt, setAttempt] = useState(0)
  const [isBusy, setIsBusy] = useState(false)
  const [trouble, setTrouble] = useState<PublishTrouble | null>(null)
  // A second try of the same words is the same command; other words are another one.
  const command = useRef({ draftRevision: -1, key: '' })

  function stopped(error: unknown) {
    if (error instanceof Problem && error.slug === 'version-stale') keeper.markStale()
    for (const { pointer, detail } of (error instanceof Problem && error.errors) || []) {
      const name = nameOf(pointer)
      if (name) form.setError(name, { type: 'server', message: detail })
    }
    const hasFields = error instanceof Problem && Boolean(error.errors?.length)
    setTrouble(hasFields ? null : { message: troubleWords(error), needsPayouts: isUnready(error) })
    setAttempt((count) => count + 1)
  }

  async function publish() {
    setTrouble(null)
    setIsBusy(true)
    try {
      if (!(await form.trigger())) return setAttempt((count) => count + 1)
      const draftRevision = await keeper.flush()
      if (command.current.draftRevision !== draftRevision)
        command.current = { draftRevision, key: newRequestKey() }
      onPublished(await submit.mutateAsync(command.current))
    } catch (error) {
      stopped(error)
    } finally {
      setIsBusy(false)
    }
  }

  return { publish, isBusy, attempt, trouble }
}

const isUnready = (error: unknown) => error instanceof Problem && error.slug === 'seller-unready'

function troubleWords(error: unknown): string {
  if (isUnready(error)) return 'Your payouts are not set up yet. The draft is saved and waits for them.'
  if (error instanceof NoAnswer) return 'No connection. The draft is kept; publish it when you are back.'
  return error instanceof Problem ? error.message : 'Something broke on our side. The draft is saved.'
}
