import { useState } from 'react'

import { WindowChoice } from './window-choice'

import { ActFailed } from '@/components/orders/act-failed'
import { Button } from '@/components/ui/button'
import { Sheet } from '@/components/ui/sheet'
import { useFilledAct } from '@/hooks/use-shipping-acts'
import type { ShownOrder } from '@/shared/contracts/orders'

/** A held pickup moved to another window than the one proposed. */
export function OtherWindow({ order, onClose }: { order: ShownOrder; onClose: () => void }) {
  const [windowId, setWindow] = useState('')
  const agree = useFilledAct('agreeNewDay', order.orderId)
  return (
    <Sheet
      title="Choose another day"
      isOpen
      onClose={onClose}
      shape="dialog"
      footer={
        <Button
          label="Take this time"
          isWide
          isDisabled={windowId === ''}
          isBusy={agree.isPending}
          busyLabel="Moving"
          onPress={() => agree.mutate({ windowId }, { onSuccess: onClose })}
        />
      }
    >
      <ActFailed error={agree.error} />
      <WindowChoice
        order={order}
        value={windowId}
        onChange={setWindow}
        emptyWords="There is no other pickup time at the moment. Wait for one, or end the order for a full refund."
      />
    </Sheet>
  )
}
