import { StyleSheet, View } from 'react-native'

import {
  TagBadges,
  TagCells,
  TagPhoto,
  TagPlace,
  TagPrice,
  TagSizeLine,
  TagTitle,
  type TitleLevel,
} from './tag-parts'
import { TagPiece } from './tag-piece'

import { Text } from '@/components/ui/text'
import { color, space } from '@/constants/theme'

import type { TagFacts } from './tag-facts'

interface Props {
  facts: TagFacts
  level: TitleLevel
  isHot?: boolean
  isFirst?: boolean
}

export function TagRow({ facts, level, isHot, isFirst }: Props) {
  return (
    <View style={styles.row}>
      <TagPiece kind="body" seam="right" isHot={isHot} style={styles.body}>
        <View style={styles.inside}>
          <View style={styles.photo}>
            <TagPhoto facts={facts} isFirst={isFirst} />
          </View>
          <View style={styles.words}>
            <TagTitle facts={facts} size="row" level={level} />
            <TagSizeLine facts={facts} size="row" />
            <TagCells facts={facts} size="row" />
            {facts.dayText ? (
              <Text size="small" tint="muted">
                {facts.dayText}
              </Text>
            ) : null}
            <TagBadges badges={facts.badges} />
          </View>
        </View>
      </TagPiece>
      <TagPiece kind="stub" seam="right" isHot={isHot} style={styles.stub}>
        <View style={styles.stubInside}>
          <TagPrice facts={facts} size="row" />
          <TagPlace facts={facts} size="row" />
        </View>
      </TagPiece>
    </View>
  )
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', alignItems: 'stretch' },
  body: { flex: 1, minWidth: 0 },
  inside: { flexDirection: 'row', flexGrow: 1, minHeight: 132 },
  photo: { width: 80 },
  words: { flex: 1, minWidth: 0, padding: space.md, gap: 6 },
  stub: { width: 114 },
  stubInside: {
    flexGrow: 1,
    justifyContent: 'space-between',
    gap: space.md,
    paddingVertical: space.md,
    paddingHorizontal: 10,
    borderLeftWidth: 2,
    borderStyle: 'dotted',
    borderLeftColor: color.edge,
  },
})
