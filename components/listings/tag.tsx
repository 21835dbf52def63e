import { useState } from 'react'
import { StyleSheet, View } from 'react-native'

import { TagCard } from './tag-card'
import { TagPage } from './tag-page'
import { TagRow } from './tag-row'

import { PressLink } from '@/components/ui/press-link'
import { radius } from '@/constants/theme'

import type { TagFacts } from './tag-facts'
import type { TagSize, TitleLevel } from './tag-parts'

interface Props {
  facts: TagFacts
  size: TagSize
  level?: TitleLevel
  /** The first tag of a page loads its photo at once. */
  isFirst?: boolean
}

/** The laminated tag. With an href the whole tag is one link; without, it is plain facts. */
export function Tag({ facts, size, level = 2, isFirst }: Props) {
  const [isHot, setIsHot] = useState(false)
  if (size === 'page') return <TagPage facts={facts} level={level} />
  const Shape = size === 'row' ? TagRow : TagCard
  const tag = <Shape facts={facts} level={level} isHot={isHot} isFirst={isFirst} />
  if (!facts.href) return <View style={styles.tag}>{tag}</View>
  return (
    <PressLink href={facts.href} look={() => styles.tag} onHotChange={setIsHot}>
      {tag}
    </PressLink>
  )
}

const styles = StyleSheet.create({ tag: { flexGrow: 1, borderRadius: radius.tag } })
