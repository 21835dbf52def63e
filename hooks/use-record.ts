import { queryOptions, useMutation, useQuery } from '@tanstack/react-query'

import { call } from '@/hooks/api'
import { STALE } from '@/hooks/stale'

const recordQuery = queryOptions({
  queryKey: ['record'],
  staleTime: STALE.live,
  queryFn: ({ signal }) => call('readRecord', { signal }),
})

const statementQuery = (month: string) =>
  queryOptions({
    queryKey: ['record', month],
    staleTime: STALE.live,
    queryFn: ({ signal }) => call('readStatement', { params: { month }, signal }),
  })

/** What the seller sold, month by month. */
export function useRecord(isReady: boolean) {
  return useQuery({ ...recordQuery, enabled: isReady })
}

/** Every order whose money was released in a month. */
export function useStatement(month: string) {
  return useQuery(statementQuery(month))
}

/** The same as a table for a spreadsheet. */
export function usePrintStatement() {
  return useMutation({ mutationFn: (month: string) => call('printStatement', { params: { month } }) })
}
