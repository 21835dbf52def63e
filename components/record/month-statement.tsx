import { StyleSheet, View } from 'react-native'

import { kindWords, monthName } from './record-words'

import { saveFile } from '@/components/trips/save-file'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { DataTable } from '@/components/ui/data-table'
import type { Column } from '@/components/ui/data-table-types'
import { ErrorState } from '@/components/ui/error-state'
import { Heading } from '@/components/ui/heading'
import { Link } from '@/components/ui/link'
import { Select } from '@/components/ui/select'
import { SkeletonRows } from '@/components/ui/skeleton'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { usePrintStatement, useStatement } from '@/hooks/use-record'
import type { Statement, StatementRow } from '@/shared/contracts/statements'
import { shortDay } from '@/components/listings/shipping-words'
import { printCount } from '@/shared/units/count'
import { printCents } from '@/shared/units/money'

const money = (key: keyof StatementRow & `${string}Cents`, title: string): Column<StatementRow> => ({
  ...{ key, title, isNumeric: true },
  cell: (row) => printCents(row[key]),
  sortBy: (row) => row[key],
})

const columns: readonly Column<StatementRow>[] = [
  {
    key: 'title',
    title: 'Order',
    minWidthPx: 200,
    cell: (row) => (
      <Link href={`/orders/${row.orderId}`} size="note">{`${printCount(row.quantity)} × ${row.title}`}</Link>
    ),
  },
  // Second, so that a phone shows it without scrolling.
  money('yoursCents', 'Yours'),
  { key: 'day', title: 'Released', cell: (row) => shortDay(row.day), sortBy: (row) => row.day },
  { key: 'kind', title: 'Kind', cell: (row) => kindWords[row.kind] },
  money('paidCents', 'Paid'),
  money('refundedCents', 'Refunded'),
  money('taxCents', 'Tax'),
  money('feeCents', 'Our fee'),
]

interface Props {
  month: string
  /** Months to choose from, the newest first. */
  months: readonly string[]
  onMonth: (month: string) => void
}

/** Every order whose money was released in a month, with its sums and a table to take along. */
export function MonthStatement({ month, months, onMonth }: Props) {
  const query = useStatement(month)
  return (
    <View style={styles.frame}>
      <Select
        label="Statement of"
        value={month}
        onChange={onMonth}
        choices={months.map((one) => ({ value: one, label: monthName(one) }))}
      />
      {query.data ? (
        <Rows statement={query.data} />
      ) : query.isPending ? (
        <SkeletonRows label="Loading the statement" rows={4} />
      ) : (
        <ErrorState
          title="The statement did not load"
          body={`${query.error.message} No money has moved by it.`}
          onRetry={() => void query.refetch()}
          isRetrying={query.isFetching}
        />
      )}
    </View>
  )
}

function Rows({ statement }: { statement: Statement }) {
  const { month, rows, total } = statement
  const print = usePrintStatement()
  const keep = () =>
    print.mutate(month, {
      onSuccess: (bytes) => saveFile(bytes, { name: `statement-${month}.csv`, type: 'text/csv' }),
    })
  if (rows.length === 0) return <Text tint="muted">{`No money was released in ${monthName(month)}.`}</Text>
  return (
    <>
      <Heading level={3} size="lead">
        {`${printCents(total.yoursCents)} yours`}
      </Heading>
      <Text>
        {`${printCents(total.paidCents)} paid by buyers, less ${printCents(total.refundedCents)} refunded, ${printCents(total.taxCents)} tax and ${printCents(total.feeCents)} our fee.`}
      </Text>
      <DataTable
        label={`Statement of ${monthName(month)}`}
        columns={columns}
        rows={rows}
        rowKey={(row) => `${row.orderId} ${row.kind}`}
      />
      {print.error ? (
        <Banner tone="danger" title="The table was not made" isLive>
          {print.error.message}
        </Banner>
      ) : null}
      <Button
        kind="secondary"
        icon="list"
        label="Take it along (CSV)"
        busyLabel="Making the table"
        isBusy={print.isPending}
        onPress={keep}
      />
    </>
  )
}

const styles = StyleSheet.create({ frame: { gap: space.md } })
