import { StyleSheet, View } from 'react-native'

import { pickupDay, pickupHours } from '@/components/listings/pickup-words'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { Text } from '@/components/ui/text'
import { color, space } from '@/constants/theme'
import type { ShownWindow } from '@/shared/contracts/listings'

export function WindowsCard({ windows }: { windows: readonly ShownWindow[] }) {
  return (
    <Card>
      <Heading level={2} size="lead">
        Pickup windows
      </Heading>
      {windows.length === 0 ? (
        <Text tint="muted">None ahead. Change the batch to offer a new one.</Text>
      ) : null}
      {windows.map((window) => (
        <View key={window.windowId} style={styles.row}>
          <View style={styles.words}>
            <Text face="strong">{pickupDay(window)}</Text>
            <Text size="note" tint="muted" isFigures>
              {pickupHours(window)}
            </Text>
          </View>
          <Text size="note" isFigures>
            {window.placesLeft === 0
              ? 'full'
              : `${window.placesLeft} ${window.placesLeft === 1 ? 'place' : 'places'} left`}
          </Text>
        </View>
      ))}
    </Card>
  )
}

const styles = StyleSheet.create({
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.lg,
    paddingTop: space.sm,
    borderTopWidth: 1,
    borderTopColor: color.line,
  },
  words: { flex: 1 },
})
