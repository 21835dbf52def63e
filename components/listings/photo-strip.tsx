import { useState } from 'react'
import { Pressable, StyleSheet, View } from 'react-native'

import { Photo } from '@/components/ui/photo'
import { Text } from '@/components/ui/text'
import { color, radius, space } from '@/constants/theme'
import { photoUrl } from '@/hooks/api'
import type { ShownListing } from '@/shared/contracts/listings'

import { plainDay } from './pickup-words'

interface Props {
  photos: ShownListing['photos']
  /** When each was taken, and whether a ruler is in it. */
  told: ShownListing['body']['photos']
}

/** One photo large, the others to choose from. */
export function PhotoStrip({ photos, told }: Props) {
  const [chosen, setChosen] = useState(0)
  const shown = photos[chosen] ?? photos[0]
  if (!shown) return null
  const facts = told.find(({ photoId }) => photoId === shown.photoId)
  return (
    <View style={styles.frame}>
      <View style={styles.large}>
        <Photo
          uri={photoUrl(shown.photoId, 1600)}
          label={shown.alt}
          ratio={1.5}
          meanColor={shown.ground}
          isFirst
        />
      </View>
      {facts ? (
        <Text size="note" tint="muted">
          {facts.caption ? `${facts.caption} ` : ''}Taken {plainDay(facts.takenOn)}
          {facts.hasRuler ? ', with a ruler.' : '.'}
        </Text>
      ) : null}
      {photos.length > 1 ? (
        <View role="group" aria-label="Photos" style={styles.others}>
          {photos.map(({ photoId, alt, ground }, index) => (
            <Pressable
              key={photoId}
              role="button"
              aria-label={`Photo ${index + 1} of ${photos.length}: ${alt}`}
              aria-pressed={index === chosen}
              onPress={() => setChosen(index)}
              style={[styles.small, index === chosen ? styles.chosen : null]}
            >
              <Photo uri={photoUrl(photoId, 320)} label="" meanColor={ground} />
            </Pressable>
          ))}
        </View>
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({
  frame: { gap: space.sm },
  large: { borderRadius: radius.tag, overflow: 'hidden', borderWidth: 1, borderColor: color.line },
  others: { flexDirection: 'row', flexWrap: 'wrap', gap: space.sm },
  small: {
    width: 72,
    height: 56,
    borderRadius: radius.tag,
    overflow: 'hidden',
    borderWidth: 2,
    borderColor: color.line,
  },
  chosen: { borderColor: color.netting },
})
