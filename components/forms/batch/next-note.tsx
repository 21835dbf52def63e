import { StyleSheet, View } from 'react-native'

import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'

import type { OwnListing } from '@/shared/contracts/listings'

const edits = [
  'Count, price, pickup windows, water and terms go live at once.',
  'Words, photos, size and further states are read first; the version on sale stays until then.',
  'Species, strain, origin, hatch date, licences and health take the batch off sale until a moderator has looked.',
]

/** What publishing does, before it is done. */
export function NextNote({ own }: { own: OwnListing }) {
  if (own.liveVersion === undefined) {
    return (
      <Text size="note" tint="muted">
        A moderator may read it before others see it. You get a mail when it is live, or when something is
        asked.
      </Text>
    )
  }
  return (
    <View style={styles.list}>
      {edits.map((sentence) => (
        <Text key={sentence} size="note" tint="muted">
          {sentence}
        </Text>
      ))}
      <Text size="note" tint="muted">
        Orders already made keep the version they were made from.
      </Text>
    </View>
  )
}

const styles = StyleSheet.create({ list: { gap: space.xs } })
