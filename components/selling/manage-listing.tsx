import { StyleSheet, View } from 'react-native'

import { OwnListingGate } from './own-listing-gate'
import { ownFacts } from './own-facts'
import { ReviewOutcome } from './review-outcome'
import { SellerGate } from './seller-gate'
import { SellingActs } from './selling-acts'
import { StockCard } from './stock-card'
import { TakenDown } from './taken-down'
import { WindowsCard } from './windows-card'

import { Tag } from '@/components/listings/tag'
import { TwoColumns } from '@/components/layout/two-columns'
import { space } from '@/constants/theme'
import { useUnits } from '@/hooks/use-units'
import type { OwnListing } from '@/shared/contracts/listings'

/** A batch that is or was on sale: its count, its windows, and the acts that look after it. */
export function ManageListing({ listingId }: { listingId: string }) {
  return (
    <SellerGate>
      {() => <OwnListingGate listingId={listingId}>{(own) => <Desk own={own} />}</OwnListingGate>}
    </SellerGate>
  )
}

function Desk({ own }: { own: OwnListing }) {
  const units = useUnits()
  return (
    <View style={styles.frame}>
      <Tag size="row" level={2} facts={{ ...ownFacts(own, units), href: undefined }} />
      <ReviewOutcome own={own} />
      <TakenDown own={own} />
      <TwoColumns
        sideLabel="What you can do"
        isSideFirst
        main={
          <>
            <StockCard own={own} />
            <WindowsCard windows={own.windows} />
          </>
        }
        side={<SellingActs own={own} />}
      />
    </View>
  )
}

const styles = StyleSheet.create({ frame: { gap: space.lg } })
