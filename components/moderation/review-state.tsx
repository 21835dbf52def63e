import { View } from 'react-native'

import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Text } from '@/components/ui/text'
import type { Review } from '@/shared/contracts/moderation'

const states: Record<Exclude<Review['review'], 'waiting'>, string> = {
  approved: 'Approved already',
  asked: 'The seller has been asked',
  rejected: 'Rejected already',
  superseded: 'The seller has sent a newer version',
}

/** Says when there is nothing to decide any more. */
export function ReviewState({ review, onReload }: { review: Review; onReload: () => void }) {
  if (review.review === 'waiting') return null
  return (
    <Banner tone="info" title={states[review.review]}>
      <Text size="note">What stands here can be read, not decided.</Text>
      <View>
        <Button kind="quiet" label="Load it again" onPress={onReload} />
      </View>
    </Banner>
  )
}
