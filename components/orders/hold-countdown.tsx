import { useEffect, useState } from 'react'

import { Banner } from '@/components/ui/banner'
import { Text } from '@/components/ui/text'
import type { ShownOrder } from '@/shared/contracts/orders'

/** Milliseconds the server's clock is ahead of this device's; the hold ends by the server's. */
const aheadMs = (order: ShownOrder, loadedAt: number) => Date.parse(order.asOf) - loadedAt

/** Counts the minutes left of an unpaid hold, by the server's clock. */
export function HoldCountdown({ order }: { order: ShownOrder }) {
  const [loadedAt] = useState(() => Date.now())
  const [at, setAt] = useState(loadedAt)
  useEffect(() => {
    const timer = setInterval(() => setAt(Date.now()), 1000)
    return () => clearInterval(timer)
  }, [])
  const endsAt = order.clock ? Date.parse(order.clock.at) : null
  if (endsAt === null) return null
  const leftS = Math.max(0, Math.round((endsAt - (at + aheadMs(order, loadedAt))) / 1000))
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
