import { useState } from 'react'

import { ActFailed } from '@/components/orders/act-failed'
import { Button } from '@/components/ui/button'
import { TextArea } from '@/components/ui/text-area'
import { useReplyToRating } from '@/hooks/use-ratings'

const MOST_WORDS = 600

/** The seller's one reply, read by everybody under the rating. */
export function ReplyToRating({ orderId }: { orderId: string }) {
  const [words, setWords] = useState('')
  const [isTried, setTried] = useState(false)
  const reply = useReplyToRating(orderId)
  const isEmpty = words.trim() === ''
  return (
    <>
      <ActFailed error={reply.error} />
      <TextArea
        label="Your reply"
        hint="Everybody can read it. You can reply once, and it stands for good."
        value={words}
        onChangeText={setWords}
        maxLength={MOST_WORDS}
        error={isTried && isEmpty ? 'Write a sentence or two.' : undefined}
      />
      <Button
        label="Reply"
        kind="secondary"
        isBusy={reply.isPending}
        busyLabel="Sending"
        onPress={() => {
          setTried(true)
          if (!isEmpty) reply.mutate({ words: words.trim() })
        }}
      />
    </>
  )
}
