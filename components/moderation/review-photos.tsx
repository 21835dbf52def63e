import { StyleSheet, View } from 'react-native'

import { Badge } from '@/components/ui/badge'
import { Link } from '@/components/ui/link'
import { Photo } from '@/components/ui/photo'
import { Text } from '@/components/ui/text'
import { color, radius, space } from '@/constants/theme'
import { photoUrl } from '@/hooks/api'
import type { Review } from '@/shared/contracts/moderation'

import type { Href } from 'expo-router'

/** Photos large enough to count fins, with what the seller says about each. */
export function ReviewPhotos({ review }: { review: Review }) {
  return (
    <View role="list" aria-label="Photos" style={styles.list}>
      {review.photos.map((photo, at) => {
        const told = review.body.photos.find((one) => one.photoId === photo.photoId)
        const full = photoUrl(photo.photoId, 1600)
        return (
          <View key={photo.photoId} role="listitem" style={styles.one}>
            <Photo
              uri={photoUrl(photo.photoId, 800)}
              label={photo.alt}
              ratio={photo.widthPx / photo.heightPx}
              meanColor={photo.ground}
              isFirst={at === 0}
            />
            <View style={styles.words}>
              {told?.hasRuler ? <Badge word="Ruler said to be there" tone="neutral" icon="check" /> : null}
              {told ? (
                <Text size="small" tint="muted" isFigures>
                  {`Taken ${told.takenOn}`}
                </Text>
              ) : null}
              <Link href={full as Href} isExternal size="note" label={`Full size: photo ${at + 1}`}>
                Full size
              </Link>
            </View>
            {told?.caption ? <Text size="note">{told.caption}</Text> : null}
          </View>
        )
      })}
    </View>
  )
}

const styles = StyleSheet.create({
  list: { flexDirection: 'row', flexWrap: 'wrap', gap: space.lg },
  one: {
    flexGrow: 1,
    flexBasis: 320,
    minWidth: 0,
    maxWidth: 720,
    gap: space.sm,
    padding: space.sm,
    borderRadius: radius.tag,
    borderWidth: 1,
    borderColor: color.line,
    backgroundColor: color.card,
  },
  words: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    columnGap: space.lg,
    rowGap: space.xs,
  },
})
