import { StyleSheet, View } from 'react-native'

import { categoryNames } from './category-words'
import { categories } from './find-params'
import { categoryIcons } from './found-facts'
import type { Find } from './use-find'

import { Chip } from '@/components/ui/chip'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'

export function CategoryChips({ find: { state, facets, change } }: { find: Find }) {
  return (
    <View role="group" aria-labelledby="find-category" style={styles.frame}>
      <Text face="strong" nativeID="find-category">
        What
      </Text>
      <View style={styles.chips}>
        {categories.map((category) => (
          <Chip
            key={category}
            label={categoryNames[category]}
            icon={categoryIcons[category]}
            // Nothing counted means zero, once the counts are there at all.
            count={
              facets ? (facets.categories.find((one) => one.category === category)?.count ?? 0) : undefined
            }
            isSelected={state.category === category}
            onPress={() => change({ category: state.category === category ? undefined : category })}
          />
        ))}
      </View>
    </View>
  )
}

const styles = StyleSheet.create({
  frame: { gap: space.sm },
  chips: { flexDirection: 'row', flexWrap: 'wrap', gap: space.sm },
})
