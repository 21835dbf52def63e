import { StyleSheet, View } from 'react-native'

import { ageWords } from './age-words'
import { FlagList } from './flag-list'

import { DataTable } from '@/components/ui/data-table'
import { PressLink } from '@/components/ui/press-link'
import { Text } from '@/components/ui/text'
import { touchPx } from '@/constants/theme'
import type { ReviewRow } from '@/shared/contracts/moderation'

import type { Column } from '@/components/ui/data-table-types'

interface Props {
  rows: readonly ReviewRow[]
  nowMs: number
}

export function QueueTable({ rows, nowMs }: Props) {
  const columns: Column<ReviewRow>[] = [
    {
      key: 'title',
      title: 'Listing',
      cell: (row) => <RowLink row={row} />,
      sortBy: (row) => row.title,
      minWidthPx: 200,
    },
    {
      key: 'flags',
      title: 'Why it waits',
      cell: (row) => <FlagList flags={row.flags} most={3} />,
      minWidthPx: 240,
    },
    {
      key: 'farmName',
      title: 'Seller',
      cell: (row) => row.farmName,
      sortBy: (row) => row.farmName,
      minWidthPx: 140,
    },
    { key: 'kind', title: 'Version', cell: versionWords, sortBy: (row) => row.number, minWidthPx: 96 },
    {
      key: 'submittedAt',
      title: 'Waits',
      cell: (row) => ageWords(Date.parse(row.submittedAt), nowMs),
      sortBy: (row) => -Date.parse(row.submittedAt),
      isNumeric: true,
      minWidthPx: 88,
    },
  ]
  return (
    <DataTable label="Listings that wait" columns={columns} rows={rows} rowKey={(row) => row.versionId} />
  )
}

export function versionWords({ number }: Pick<ReviewRow, 'number'>): string {
  return number === 1 ? 'first' : `change ${number - 1}`
}

function RowLink({ row }: { row: ReviewRow }) {
  return (
    <PressLink
      href={{ pathname: '/moderate/listings/[versionId]', params: { versionId: row.versionId } }}
      nativeID={`desk-row-${row.versionId}`}
      look={() => styles.link}
    >
      <View>
        <Text size="note" face="strong" tint="netting" style={styles.title}>
          {row.title}
        </Text>
      </View>
    </PressLink>
  )
}

const styles = StyleSheet.create({
  link: { minHeight: touchPx, justifyContent: 'center' },
  title: { textDecorationLine: 'underline' },
})
