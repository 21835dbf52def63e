import { useRouter } from 'expo-router'
import { useState } from 'react'

import { Button } from '@/components/ui/button'
import { Confirm } from '@/components/ui/confirm'
import { useToast } from '@/components/ui/toast'
import { forgetDraft } from '@/hooks/kept-drafts'
import { useDiscardDraft } from '@/hooks/use-submit-listing'

import type { OwnListing } from '@/shared/contracts/listings'

/** A draft nobody has seen may be thrown away; the server says when. */
export function DiscardAct({ own }: { own: OwnListing }) {
  const router = useRouter()
  const toast = useToast()
  const discard = useDiscardDraft(own.listingId)
  const [isAsking, setIsAsking] = useState(false)
  if (!own.may.includes('discard')) return null
  function throwAway() {
    discard.mutate(undefined, {
      onSuccess: () => {
        forgetDraft(own.listingId)
        router.replace('/sell')
      },
      onError: (error) => {
        setIsAsking(false)
        toast({ tone: 'danger', text: error.message })
      },
    })
  }
  return (
    <>
      <Button kind="quiet" icon="trash" label="Throw this draft away" onPress={() => setIsAsking(true)} />
      <Confirm
        title="Throw this draft away?"
        isOpen={isAsking}
        actLabel="Throw it away"
        keepLabel="Keep it"
        isDanger
        isBusy={discard.isPending}
        busyLabel="Throwing it away"
        onAct={throwAway}
        onClose={() => setIsAsking(false)}
      >
        What you typed for this batch is gone then. Nobody else has seen it.
      </Confirm>
    </>
  )
}
