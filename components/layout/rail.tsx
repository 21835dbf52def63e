import { usePathname } from 'expo-router'
import { StyleSheet, View } from 'react-native'

import { Brand } from './brand'
import { NoticeBell } from './notice-bell'
import { PlaceLink } from './place-link'
import { isInPlace, places } from './places'

import { color, layout, space } from '@/constants/theme'

interface Props {
  isNarrow: boolean
}

export function Rail({ isNarrow }: Props) {
  const pathname = usePathname()
  return (
    <View dataSet={{ screenOnly: '' }} style={[styles.rail, isNarrow ? styles.narrow : styles.full]}>
      <View role="banner" style={isNarrow ? styles.centre : styles.brand}>
        <Brand isMarkOnly={isNarrow} />
      </View>
      <View role="navigation" aria-label="Places" style={styles.places}>
        {places.map((place) => (
          <View key={place.label} style={isNarrow ? styles.stackedPlace : null}>
            <PlaceLink {...place} isStacked={isNarrow} isCurrent={isInPlace(pathname, place.href)} />
          </View>
        ))}
        <NoticeBell hasWord={!isNarrow} />
      </View>
    </View>
  )
}

const styles = StyleSheet.create({
  rail: {
    backgroundColor: color.card,
    borderRightWidth: 1,
    borderRightColor: color.line,
    paddingVertical: space.lg,
    gap: space.xl,
  },
  narrow: { width: layout.smallRailPx, paddingHorizontal: space.xs },
  full: { width: layout.railPx, paddingHorizontal: space.md },
  centre: { alignItems: 'center' },
  brand: { paddingHorizontal: space.md },
  places: { gap: space.xs },
  stackedPlace: { height: 68 },
})
