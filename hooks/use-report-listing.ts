import { useMutation } from '@tanstack/react-query'

import { call } from '@/hooks/api'
import type { BodyOf } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'

export type ListingReport = BodyOf<Endpoints['reportListing']>

/** Tells the moderators what is wrong with a listing. */
export function useReportListing(listingId: string) {
  return useMutation({
    mutationFn: ({ report, key }: { report: ListingReport; key: string }) =>
      call('reportListing', { params: { listingId }, body: report, key }),
  })
}
