import { Page } from '@/components/layout/page'
import { SkeletonRows } from '@/components/ui/skeleton'

export function ListingLoading() {
  return (
    <Page title="Listing" isHeadingHidden back={{ label: 'Back to find', href: '/' }}>
      <SkeletonRows label="Loading the listing" rows={3} />
    </Page>
  )
}
