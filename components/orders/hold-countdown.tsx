import { useEffect, useState } from 'react'

import { holdLeftS } from '@/components/orders/hold-left'
import { Banner } from '@/components/ui/banner'
import { Text } from '@/components/ui/text'
import type { ShownOrder } from '@/shared/contracts/orders'

interface Props {
  order: ShownOrder
  /** When the answer came that the order was read from, by this device's clock. */
  receivedAtMs: number
}

/** Counts the minutes left of an unpaid hold, by the server's clock. */
export function HoldCountdown({ order, receivedAtMs }: Props) {
  const [at, setAt] = useState(() => Date.now())
  useEffect(() => {
    const timer = setInterval(() => setAt(Date.now()), 1000)
    return () => clearInterval(timer)
  }, [])
  if (!order.clock) return null
  const hold = { endsAtMs: Date.parse(order.clock.at), asOfMs: Date.parse(order.asOf), receivedAtMs }
  const leftS = holdLeftS(hold, Math.max(at, receivedAtMs))
  const clock = `${Math.floor(leftS / 60)}:${String(leftS % 60).padStart(2, '0')}`
  return (
    <Banner
      tone={leftS < 120 ? 'caution' : 'info'}
      title={leftS === 0 ? 'The hold is ending' : `Held for you: ${clock} left`}
    >
      <Text>Pay now to keep them. The price stays as it is until then.</Text>
    </Banner>
  )
}
