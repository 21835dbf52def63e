import { usePathname } from 'expo-router'
import { StyleSheet, View } from 'react-native'
import { useSafeAreaInsets } from 'react-native-safe-area-context'

import { PlaceLink } from './place-link'
import { isInPlace, places } from './places'

import { color, space } from '@/constants/theme'

export function PhoneBar() {
  const pathname = usePathname()
  const { bottom } = useSafeAreaInsets()
  return (
    <View
      role="navigation"
      aria-label="Places"
      dataSet={{ screenOnly: '' }}
      style={[styles.bar, { paddingBottom: bottom }]}
    >
      {places.map((place) => (
        <PlaceLink key={place.label} {...place} isStacked isCurrent={isInPlace(pathname, place.href)} />
      ))}
    </View>
  )
}

const styles = StyleSheet.create({
  bar: {
    flexDirection: 'row',
    backgroundColor: color.card,
    borderTopWidth: 1,
    borderTopColor: color.line,
    paddingHorizontal: space.sm,
  },
})
