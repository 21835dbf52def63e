import { ageWords } from './age-words'
import { ReportList } from './report-list'
import { ReportedButtons } from './reported-buttons'
import { ReportedLink } from './reported-link'
import type { ReportedActs } from './reported-list'

import { DataTable } from '@/components/ui/data-table'
import type { ReportedListing } from '@/shared/contracts/listing-reports'

import type { Column } from '@/components/ui/data-table-types'

interface Props {
  rows: readonly ReportedListing[]
  acts: ReportedActs
}

export function ReportedTable({ rows, acts }: Props) {
  const columns: Column<ReportedListing>[] = [
    {
      key: 'title',
      title: 'Listing',
      cell: (row) => <ReportedLink row={row} acts={acts} />,
      sortBy: (row) => row.title,
      minWidthPx: 180,
    },
    {
      key: 'people',
      title: 'What is said',
      cell: (row) => <ReportList row={row} />,
      sortBy: (row) => -row.people,
      minWidthPx: 280,
    },
    {
      key: 'farmName',
      title: 'Seller',
      cell: (row) => row.farmName,
      sortBy: (row) => row.farmName,
      minWidthPx: 140,
    },
    {
      key: 'firstAt',
      title: 'Waits',
      cell: (row) => ageWords(Date.parse(row.firstAt), acts.nowMs),
      sortBy: (row) => -Date.parse(row.firstAt),
      isNumeric: true,
      minWidthPx: 88,
    },
    {
      key: 'acts',
      title: 'Decide',
      cell: (row) => <ReportedButtons row={row} acts={acts} />,
      minWidthPx: 200,
    },
  ]
  return <DataTable label="Reported listings" columns={columns} rows={rows} rowKey={(row) => row.listingId} />
}
