import { StyleSheet, View } from 'react-native'

import { placeKindWords } from './batch-words'
import { pickupDay, pickupHours } from './pickup-words'

import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { Icon } from '@/components/ui/icon'
import { Text } from '@/components/ui/text'
import { color, space } from '@/constants/theme'
import type { ShownWindow } from '@/shared/contracts/listings'

export function PickupWindows({ windows }: { windows: readonly ShownWindow[] }) {
  return (
    <Card>
      <Heading level={2} size="lead">
        Pickup
      </Heading>
      {windows.length === 0 ? (
        <Text tint="muted">No window is open now. The grower may add one: look again in a few days.</Text>
      ) : (
        <View role="list">
          {windows.map((window, index) => (
            <View key={window.windowId} role="listitem" style={[styles.row, index > 0 ? styles.ruled : null]}>
              <Icon name="calendar" tint="muted" />
              <View style={styles.words}>
                <Text face="strong" isFigures>
                  {pickupDay(window)}
                </Text>
                <Text size="note" isFigures>
                  {pickupHours(window)}
                </Text>
                <Text size="note" tint="muted">
                  {placeKindWords(window.placeKind)}
                </Text>
              </View>
              <Text size="note" tint={window.placesLeft > 0 ? 'ink' : 'danger'} isFigures>
                {placesWords(window.placesLeft)}
              </Text>
            </View>
          ))}
        </View>
      )}
      <Text size="note" tint="muted">
        The exact address shows once your order is scheduled. Times are those of the place.
      </Text>
    </Card>
  )
}

function placesWords(placesLeft: number): string {
  if (placesLeft === 0) return 'Full'
  return placesLeft === 1 ? '1 place left' : `${placesLeft} places left`
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', alignItems: 'flex-start', gap: space.md, paddingVertical: space.sm },
  ruled: { borderTopWidth: 1, borderTopColor: color.line },
  words: { flex: 1, minWidth: 0 },
})
