import { useState } from 'react'
import { StyleSheet, View } from 'react-native'

import { MonthStatement } from './month-statement'
import { informWords } from './record-words'
import { SalesPlot } from './sales-plot'

import { SellerGate } from '@/components/selling/seller-gate'
import { Card } from '@/components/ui/card'
import { ErrorState } from '@/components/ui/error-state'
import { Heading } from '@/components/ui/heading'
import { SkeletonRows } from '@/components/ui/skeleton'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { useRecord } from '@/hooks/use-record'
import type { SellerRecord } from '@/shared/contracts/statements'

/** What a seller sold and was paid: a year by kind, a month to the cent, and what the law counts. */
export function RecordHome() {
  return <SellerGate>{() => <Loaded />}</SellerGate>
}

function Loaded() {
  const query = useRecord(true)
  if (query.isPending) return <SkeletonRows label="Loading your record" rows={6} />
  if (!query.data) {
    return (
      <ErrorState
        title="Your record did not load"
        body={`${query.error.message} No money has moved by it.`}
        onRetry={() => void query.refetch()}
        isRetrying={query.isFetching}
      />
    )
  }
  return <Shown record={query.data} />
}

function Shown({ record: { months, inform } }: { record: SellerRecord }) {
  const newestFirst = months.map(({ month }) => month).reverse()
  const lastSold = months.findLast(({ kinds }) => kinds.length > 0)?.month
  const [month, setMonth] = useState(lastSold ?? newestFirst[0] ?? '')
  return (
    <View style={styles.frame}>
      <Card labelledBy="record-year">
        <Heading level={2} size="lead" nativeID="record-year">
          The last twelve months
        </Heading>
        {lastSold ? (
          <>
            <SalesPlot months={months} />
            <Text size="note" tint="muted">
              Goods of complete orders by the month in which their money was released; boxes, freight and tax
              are not in it.
            </Text>
          </>
        ) : (
          <Text tint="muted">
            Nothing is complete yet. What you sell stands here once its money is released.
          </Text>
        )}
      </Card>
      <Card labelledBy="record-month">
        <Heading level={2} size="lead" nativeID="record-month">
          A month to the cent
        </Heading>
        <MonthStatement month={month} months={newestFirst} onMonth={setMonth} />
      </Card>
      <Card labelledBy="record-inform">
        <Heading level={2} size="lead" nativeID="record-inform">
          What the law counts
        </Heading>
        <Text>{informWords(inform)}</Text>
        <Text size="note" tint="muted">
          INFORM Consumers Act, by the guidance of the Federal Trade Commission, read in part. Not legal
          advice.
        </Text>
      </Card>
    </View>
  )
}

const styles = StyleSheet.create({ frame: { gap: space.lg } })
