import { StyleSheet, View } from 'react-native'

import { Badge } from '@/components/ui/badge'
import { Heading } from '@/components/ui/heading'
import { Icon } from '@/components/ui/icon'
import { Photo } from '@/components/ui/photo'
import { Text } from '@/components/ui/text'
import { color, font, space, type } from '@/constants/theme'

import type { TagBadge, TagFacts } from './tag-facts'

export type TagSize = 'row' | 'card' | 'page'
export type TitleLevel = 2 | 3 | 4

interface PartProps {
  facts: TagFacts
  size: TagSize
}

export function TagTitle({ facts, size, level }: PartProps & { level: TitleLevel }) {
  const isPage = size === 'page'
  return (
    <View style={styles.title}>
      <Heading level={level} style={[isPage ? type.hero : type.lead, font.species]}>
        {facts.title}
      </Heading>
      {facts.scientificName ? (
        <Text size={isPage ? 'body' : 'small'} tint="muted" style={styles.italic}>
          {facts.scientificName}
        </Text>
      ) : null}
    </View>
  )
}

export function TagSizeLine({ facts, size }: PartProps) {
  const isPage = size === 'page'
  return (
    <View style={styles.sizeLine}>
      <Text size={isPage ? 'title' : 'lead'} face="strong">
        {facts.sizeText}
      </Text>
      {facts.stage ? (
        <Text size={isPage ? 'body' : 'note'} tint="muted">
          {facts.stage}
        </Text>
      ) : null}
    </View>
  )
}

/** Count and temperature, always in the same place; a day follows when one is set. */
export function TagCells({ facts, size }: PartProps) {
  const cells = [
    { caption: 'On hand', value: facts.countText },
    ...(facts.waterText ? [{ caption: 'Water', value: facts.waterText }] : []),
    ...(size === 'page' && facts.dayText ? [{ caption: 'Next day', value: facts.dayText }] : []),
  ]
  return (
    <View style={styles.clip}>
      <View style={styles.cells}>
        {cells.map(({ caption, value }) => (
          <View key={caption} style={styles.cell}>
            <Text size="small" tint="muted">
              {`${caption} `}
            </Text>
            <Text size={size === 'page' ? 'lead' : 'body'} face="strong">
              {value}
            </Text>
          </View>
        ))}
      </View>
    </View>
  )
}

export function TagBadges({ badges }: { badges: readonly TagBadge[] }) {
  if (badges.length === 0) return null
  return (
    <View style={styles.badges}>
      {badges.map((badge) => (
        <Badge key={badge.word} {...badge} />
      ))}
    </View>
  )
}

export function TagPhoto({ facts, isFirst }: { facts: TagFacts; isFirst?: boolean }) {
  if (facts.photoUrl) {
    return <Photo uri={facts.photoUrl} label={facts.photoText ?? facts.title} isFirst={isFirst} />
  }
  return (
    <View style={styles.noPhoto}>
      <Icon name={facts.icon ?? 'fish'} sizePx={36} tint="edge" />
    </View>
  )
}

export function TagPrice({ facts, size }: PartProps) {
  const isPage = size === 'page'
  return (
    <View>
      <Text size={isPage ? 'hero' : facts.priceText.length > longPrice ? 'body' : 'lead'} face="title">
        {facts.priceText}
      </Text>
      <Text size={isPage ? 'body' : 'small'} tint="muted">
        {facts.priceUnitText}
      </Text>
    </View>
  )
}

export function TagPlace({ facts, size, isAtEnd }: PartProps & { isAtEnd?: boolean }) {
  const isPage = size === 'page'
  const align = isAtEnd ? styles.end : null
  return (
    <View style={isAtEnd ? styles.placeAtEnd : null}>
      {facts.distanceText ? (
        <Text size={isPage ? 'lead' : 'note'} face="strong" style={align}>
          {keepUnit(facts.distanceText)}
        </Text>
      ) : null}
      <Text size={isPage ? 'note' : 'small'} tint="muted" style={align}>
        {facts.placeText}
      </Text>
    </View>
  )
}

const longPrice = 7 // characters: "$1,200.00" would break on the stub

// "about 118 mi" breaks before the figure, never between the figure and its unit.
function keepUnit(text: string): string {
  return text.replace(/ (\S+)$/, '\u00a0$1')
}

const styles = StyleSheet.create({
  title: { gap: 2 },
  italic: { fontStyle: 'italic' },
  sizeLine: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'baseline', columnGap: space.sm },
  // The rule before the first cell of each line is cut off, wherever the lines break.
  clip: { overflow: 'hidden' },
  cells: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    columnGap: space.md,
    rowGap: space.xs,
    marginLeft: -(space.md + 1),
  },
  cell: { borderLeftWidth: 1, borderLeftColor: color.line, paddingLeft: space.md },
  badges: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.md, rowGap: 2 },
  noPhoto: {
    width: '100%',
    height: '100%',
    alignItems: 'center',
    justifyContent: 'center',
    backgroundColor: color.sunk,
  },
  end: { textAlign: 'right' },
  placeAtEnd: { alignItems: 'flex-end', flexShrink: 1 },
})
