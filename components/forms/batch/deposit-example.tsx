import { useWatch } from 'react-hook-form'

import { figures } from '@/components/forms/figure'
import { Text } from '@/components/ui/text'
import { quoteOrder } from '@/shared/domain/money/quote-order'
import { printCount } from '@/shared/units/count'
import { printCents } from '@/shared/units/money'

import type { BatchTyping } from './batch-typing'

const bpPerPercent = 100

/** The deposit on the smallest order, from the same arithmetic an order uses. Nothing until it can be computed. */
export function DepositExample() {
  const [minText, depositText, tiers] = useWatch<BatchTyping, ['minOrder', 'depositPct', 'tiers']>({
    name: ['minOrder', 'depositPct', 'tiers'],
  })
  const quantity = figures.count.read(minText)
  const depositPct = figures.percent.read(depositText)
  const fromCount = figures.count.read(tiers[0]?.fromCount ?? '')
  const unitCents = figures.cents.read(tiers[0]?.unitCents ?? '')
  if (!quantity || !depositPct || !fromCount || !unitCents || quantity < fromCount) return null
  const none = { boxCents: 0, freightCents: 0, taxCents: 0, feeBp: 0 }
  const quote = quoteOrder({
    ...none,
    tiers: [{ fromCount, unitCents }],
    quantity,
    depositBp: Math.round(depositPct * bpPerPercent),
  })
  return (
    <Text size="note" isFigures>
      {`Smallest order, ${printCount(quantity)} fish at ${printCents(unitCents)}: ${printCents(quote.depositCents)} deposit, ${printCents(quote.balanceCents)} at pickup.`}
    </Text>
  )
}
