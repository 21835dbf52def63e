import { StyleSheet, View } from 'react-native'

import { toolList } from './tool-list'

import { Icon } from '@/components/ui/icon'
import { PressLink } from '@/components/ui/press-link'
import { Text } from '@/components/ui/text'
import { color, radius, space } from '@/constants/theme'

const season = {
  id: 'season',
  title: 'When they can be shipped',
  lead: 'The year between two places, week by week: safe, with packs, too cold or too hot.',
}

const parcel = {
  id: 'parcel',
  title: 'A parcel: will they survive, and how to pack',
  lead: 'The trip check for a box with bags: what happens in the water hour by hour, the plan, and a sheet to print.',
}

/** Every calculator, each with the sentence that says what it is for. */
export function ToolsHome() {
  return (
    <View role="list" aria-label="Calculators" style={styles.list}>
      {[parcel, season, ...toolList].map(({ id, title, lead }) => (
        <View key={id} role="listitem">
          <PressLink
            href={`/tools/${id}`}
            look={({ pressed, hovered }) => [styles.row, pressed || hovered ? styles.hot : null]}
          >
            <View style={styles.words}>
              <Text face="title" size="lead">
                {title}
              </Text>
              <Text size="note" tint="muted">
                {lead}
              </Text>
            </View>
            <Icon name="forward" sizePx={20} tint="netting" />
          </PressLink>
        </View>
      ))}
    </View>
  )
}

const styles = StyleSheet.create({
  list: { gap: space.md },
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.md,
    padding: space.lg,
    borderRadius: radius.tag,
    borderWidth: 1,
    borderColor: color.line,
    backgroundColor: color.card,
  },
  hot: { backgroundColor: color.sunk },
  words: { flex: 1, minWidth: 0, gap: 4 },
})
