import { countedWords } from './counted-words'

import type { SupplyBody } from '@/components/supplies/supply-body'
import { Card } from '@/components/ui/card'
import { DataTable } from '@/components/ui/data-table'
import type { Column } from '@/components/ui/data-table-types'
import { Heading } from '@/components/ui/heading'
import { Text } from '@/components/ui/text'
import type { FishBody } from '@/shared/contracts/fish-batch'
import { nextTier, tierFor } from '@/shared/domain/money/tier-price'
import { printCount } from '@/shared/units/count'
import { printCents } from '@/shared/units/money'

type Tier = FishBody['tiers'][number]

const ofAll: readonly Column<Tier>[] = [
  { key: 'from', title: 'From', cell: ({ fromCount }) => printCount(fromCount), isNumeric: true },
  { key: 'one', title: 'For one', cell: ({ unitCents }) => printCents(unitCents), isNumeric: true },
]
/** Fish are compared by the hundred; a hundred heads of lettuce compare with nothing. */
const ofFish: readonly Column<Tier>[] = [
  ...ofAll,
  { key: 'hundred', title: 'For 100', cell: ({ unitCents }) => printCents(unitCents * 100), isNumeric: true },
]

interface Props {
  body: FishBody | SupplyBody
  count: number
}

export function PriceTable({ body, count }: Props) {
  // The first price may be written from a smaller count than anybody can order.
  const tiers = body.tiers.map((tier) => ({ ...tier, fromCount: Math.max(tier.fromCount, body.minOrder) }))
  const unitCents = tierFor(tiers, count)?.unitCents ?? 0
  const next = nextTier(tiers, count)
  return (
    <Card>
      <Heading level={2} size="lead">
        Price
      </Heading>
      <DataTable
        label="Price by count"
        columns={body.category === 'fish' ? ofFish : ofAll}
        rows={tiers}
        rowKey={(tier) => String(tier.fromCount)}
      />
      <Text>
        {countedWords(body, count)} {count === 1 ? 'costs' : 'cost'}{' '}
        <Text face="strong" isFigures>
          {printCents(unitCents * count)}
        </Text>
        , {printCents(unitCents)} each.
      </Text>
      {next ? (
        <Text size="note" tint="muted">
          {printCount(next.missing)} more, and each costs {printCents(next.unitCents)}.
        </Text>
      ) : null}
    </Card>
  )
}
