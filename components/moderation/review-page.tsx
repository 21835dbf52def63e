import type { ReactNode } from 'react'
import { StyleSheet, View } from 'react-native'

import { DiffTable } from './diff-table'
import { FlagList } from './flag-list'
import { ReviewFacts } from './review-facts'
import { ReviewPhotos } from './review-photos'
import { ReviewRules } from './review-rules'
import { ReviewState } from './review-state'
import { SellerRecord } from './seller-record'

import { Page } from '@/components/layout/page'
import { Button } from '@/components/ui/button'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { IconButton } from '@/components/ui/icon-button'
import { space } from '@/constants/theme'
import { useBreakpoint } from '@/hooks/use-breakpoint'
import type { Review } from '@/shared/contracts/moderation'

interface Props {
  review: Review
  /** The buttons of a decision; null when it was made already. */
  decision: ReactNode
  previous: string | undefined
  next: string | undefined
  onShow: (versionId: string | undefined) => void
  onKeys: () => void
  onReload: () => void
}

export function ReviewPage({ review, decision, previous, next, onShow, onKeys, onReload }: Props) {
  const breakpoint = useBreakpoint()
  const isWide = breakpoint === 'wide'
  const flags = (
    <Card>
      <Heading level={2} size="lead">
        Why it waits
      </Heading>
      <FlagList flags={review.flags} />
    </Card>
  )
  const record = (
    <>
      <SellerRecord seller={review.seller} />
      <ReviewRules review={review} />
    </>
  )
  const side = (
    <View style={styles.column}>
      {isWide && decision ? (
        <Card>
          {decision}
          <Button kind="quiet" label="All keys (?)" onPress={onKeys} />
        </Card>
      ) : null}
      {flags}
      {record}
    </View>
  )
  const main = (
    <View style={styles.column}>
      <DiffTable review={review} />
      <ReviewPhotos review={review} />
      <ReviewFacts body={review.body} />
    </View>
  )
  return (
    <Page
      title={`Review: ${review.title}`}
      heading={review.title}
      intro={`Version ${review.number}, sent ${new Date(review.submittedAt).toLocaleString('en-US', { dateStyle: 'medium', timeStyle: 'short' })}`}
      back={{ label: 'Back to the queue', href: '/moderate' }}
      actions={
        <View style={styles.acts}>
          <IconButton
            icon="up"
            label="Previous listing"
            isDisabled={!previous}
            onPress={() => onShow(previous)}
          />
          <IconButton icon="down" label="Next listing" isDisabled={!next} onPress={() => onShow(next)} />
        </View>
      }
      footer={isWide ? undefined : decision}
      width={isWide ? 'full' : 'page'}
    >
      <ReviewState review={review} onReload={onReload} />
      {isWide ? (
        <View style={styles.row}>
          <View style={styles.main}>{main}</View>
          <View role="complementary" aria-label="Decision and record" style={styles.side}>
            {side}
          </View>
        </View>
      ) : (
        <View style={styles.column}>
          {flags}
          {main}
          {record}
        </View>
      )}
    </Page>
  )
}

const sticky = { position: 'sticky', top: space.lg } as object

const styles = StyleSheet.create({
  acts: { flexDirection: 'row' },
  row: { flexDirection: 'row', alignItems: 'flex-start', gap: space.xl },
  main: { flex: 1, minWidth: 0 },
  side: { width: 340, ...sticky },
  column: { gap: space.lg },
})
