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

export function TagCard({ facts, level, isHot, isFirst }: Props) {
  return (
    <View style={styles.card}>
      <TagPiece kind="body" seam="bottom" isHot={isHot} style={styles.body}>
        <View style={styles.photo}>
          <TagPhoto facts={facts} isFirst={isFirst} />
        </View>
        <View style={styles.words}>
          <TagTitle facts={facts} size="card" level={level} />
          <TagSizeLine facts={facts} size="card" />
          <TagCells facts={facts} size="card" />
          {facts.dayText ? (
            <Text size="small" tint="muted">
              {facts.dayText}
            </Text>
          ) : null}
          <TagBadges badges={facts.badges} />
        </View>
      </TagPiece>
      <TagPiece kind="stub" seam="bottom" isHot={isHot}>
        <View style={styles.stubInside}>
          <TagPrice facts={facts} size="card" />
          <TagPlace facts={facts} size="card" isAtEnd />
        </View>
      </TagPiece>
    </View>
  )
}

const styles = StyleSheet.create({
  card: { flexGrow: 1 },
  body: { flexGrow: 1 },
  photo: { aspectRatio: 1.6, width: '100%' },
  words: { flexGrow: 1, padding: space.lg, gap: space.sm },
  stubInside: {
    flexDirection: 'row',
    justifyContent: 'space-between',
    gap: space.md,
    paddingVertical: space.md,
    paddingHorizontal: space.lg,
    borderTopWidth: 2,
    borderStyle: 'dotted',
    borderTopColor: color.edge,
  },
})
