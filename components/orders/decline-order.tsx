import { useState } from 'react'

import { Button } from '@/components/ui/button'
import { Banner } from '@/components/ui/banner'
import { RadioGroup } from '@/components/ui/radio-group'
import { Sheet } from '@/components/ui/sheet'
import { TextArea } from '@/components/ui/text-area'
import { Text } from '@/components/ui/text'
import { useDecline } from '@/hooks/use-orders'
import type { ShownOrder } from '@/shared/contracts/orders'

const reasons = [
  { value: 'short-count', label: 'Fewer animals than I thought' },
  { value: 'not-ready', label: 'They are not ready by that day' },
  { value: 'sick', label: 'They are not well' },
  { value: 'cannot-make-slot', label: 'I cannot be there at that time' },
  { value: 'other', label: 'Something else' },
] as const
type Reason = (typeof reasons)[number]['value']

interface Props {
  order: ShownOrder
  isOpen: boolean
  onClose: () => void
}

/** The seller says no, with the reason the buyer will read. */
export function DeclineOrder({ order, isOpen, onClose }: Props) {
  const [reason, setReason] = useState<Reason | ''>('')
  const [note, setNote] = useState('')
  const [isMissing, setMissing] = useState(false)
  const decline = useDecline(order.orderId)
  const send = () => {
    if (reason === '') {
      setMissing(true)
      return
    }
    decline.mutate({ reason, ...(note.trim() ? { note: note.trim() } : {}) }, { onSuccess: onClose })
  }
  return (
    <Sheet
      title="Decline this request"
      isOpen={isOpen}
      onClose={onClose}
      shape="dialog"
      footer={
        <Button
          label="Decline and let the deposit go"
          kind="danger"
          isWide
          isBusy={decline.isPending}
          busyLabel="Declining"
          onPress={send}
        />
      }
    >
      {decline.error ? (
        <Banner tone="danger" title="That did not work" isLive>
          <Text>{decline.error.message}</Text>
        </Banner>
      ) : null}
      <RadioGroup
        label="Why?"
        value={reason}
        choices={reasons}
        onChange={(value) => {
          setReason(value)
          setMissing(false)
        }}
        error={isMissing ? 'Choose a reason: the buyer will read it.' : undefined}
      />
      <TextArea label="A word to the buyer" hint="Optional" value={note} onChangeText={setNote} />
    </Sheet>
  )
}
