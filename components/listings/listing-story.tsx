import { lazy } from 'react'

import { ArrivalPromise } from './arrival-promise'
import { BatchFacts } from './batch-facts'
import { CountPicker } from './count-picker'
import { MoneyTerms } from './money-terms'
import type { CountLimits } from './order-count'
import { pageFacts } from './page-facts'
import { PhotoStrip } from './photo-strip'
import { PickupWindows } from './pickup-windows'
import { PriceTable } from './price-table'
import { ReportListing } from './report-listing'
import type { Refusal } from './selling-state'
import { SupplyStory } from './supply-story'
import { Tag } from './tag'

import { TwoColumns } from '@/components/layout/two-columns'
import { PlaceField } from '@/components/places/place-field'
import { CautionList } from '@/components/rules/caution-list'
import { listingCautions } from '@/components/rules/listing-cautions'
import { LegalStatus } from '@/components/rules/legal-status'
import { SellerSummary } from '@/components/sellers/seller-summary'
import { Banner } from '@/components/ui/banner'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { LazyPart } from '@/components/ui/lazy-part'
import { Text } from '@/components/ui/text'
import { useBreakpoint } from '@/hooks/use-breakpoint'
import { useCurrentPlace } from '@/hooks/use-current-place'
import { useUnits } from '@/hooks/use-units'
import type { ShownListing } from '@/shared/contracts/listings'
import { promiseOf } from '@/shared/domain/listings/claim-promise'
import { shippingOf } from '@/shared/domain/listings/shipping-of'

interface Props {
  listing: ShownListing
  count: number
  limits: CountLimits
  refusal: Refusal | null
  placeLabel: string
  /** ZIP or cell that distance and law are shown for. */
  near: string | undefined
  onCount: (count: number) => void
  /** The reader has chosen a place of their own. */
  onPlace: () => void
}

const TripCheck = lazy(() =>
  import('@/components/tools/tools-group').then((group) => ({ default: group.TripCheck })),
)

const YourWater = lazy(() =>
  import('@/components/tools/tools-group').then((group) => ({ default: group.YourWater })),
)

const ListingShipping = lazy(() =>
  import('@/components/tools/tools-group').then((group) => ({ default: group.ListingShipping })),
)

const ListingShipDays = lazy(() =>
  import('@/components/orders/orders-group').then((group) => ({ default: group.ListingShipDays })),
)

export function ListingStory(props: Props) {
  const { listing, count, limits, refusal, placeLabel, near, onCount, onPlace } = props
  const units = useUnits()
  const { choose } = useCurrentPlace()
  const { body, gate } = listing
  const promise = promiseOf(body)
  const canBuy = refusal === null
  // Where the law is why nothing can be held, it is the first thing to read.
  const isLawful = gate?.buy !== 'no' && gate?.buy !== 'ask-moderators'
  const legal = gate ? <LegalStatus gate={gate} /> : null
  const isPhone = useBreakpoint() === 'phone'
  const photos = <PhotoStrip photos={listing.photos} told={body.photos} />
  return (
    <>
      <Tag facts={pageFacts(listing, { units, count })} size="page" />
      {refusal ? (
        <Banner tone={refusal.tone} title={refusal.title}>
          {refusal.words}
        </Banner>
      ) : null}
      {isPhone ? photos : null}
      <TwoColumns
        sideLabel="Price, pickup and grower"
        isSideFirst
        main={
          <>
            {isPhone ? null : photos}
            {body.words ? (
              <Card>
                <Heading level={2} size="lead">
                  In the grower’s words
                </Heading>
                <Text>{body.words}</Text>
              </Card>
            ) : null}
            {canBuy && body.category === 'fish' ? (
              <LazyPart label="Loading the trip check">
                <TripCheck listing={listing} count={count} near={near} />
              </LazyPart>
            ) : null}
            {shippingOf(body) ? (
              <LazyPart label="Loading the shipping season">
                <ListingShipping listing={listing}>
                  <LazyPart label="Loading the next ship days">
                    <ListingShipDays listing={listing} count={count} near={near} canBuy={canBuy} />
                  </LazyPart>
                </ListingShipping>
              </LazyPart>
            ) : null}
            {body.category === 'fish' ? (
              <>
                <BatchFacts body={body} />
                <LazyPart label="Loading the waters">
                  <YourWater water={body.water} />
                </LazyPart>
              </>
            ) : (
              <LazyPart label="Loading the facts">
                <SupplyStory body={body} count={count} />
              </LazyPart>
            )}
            <MoneyTerms body={body} />
            {promise ? <ArrivalPromise promise={promise} /> : null}
            <CautionList cautions={listingCautions(gate)} />
          </>
        }
        side={
          <>
            {isLawful ? null : legal}
            {canBuy ? (
              <Card>
                <CountPicker body={body} count={count} limits={limits} onChange={onCount} />
              </Card>
            ) : null}
            <PriceTable body={body} count={count} />
            <PickupWindows windows={listing.windows} />
            <Card>
              <PlaceField
                label={body.category === 'fish' ? 'Where will they live?' : 'Where are you?'}
                hint={
                  gate ? undefined : 'Then we can say how far it is, and what we know about the rules there.'
                }
                placeLabel={placeLabel}
                onChoose={(place) => {
                  choose(place)
                  onPlace()
                }}
              />
            </Card>
            {isLawful ? legal : null}
            <SellerSummary seller={listing.seller} alsoOnSale={listing.alsoOnSale} />
            <ReportListing listing={listing} />
          </>
        }
      />
    </>
  )
}
