import type { Href } from 'expo-router'
import { StyleSheet, View } from 'react-native'

import { Icon } from '@/components/ui/icon'
import { PressLink } from '@/components/ui/press-link'
import { Text } from '@/components/ui/text'
import { color, radius, space } from '@/constants/theme'

import type { IconName } from '@/components/ui/icon-paths'

interface Props {
  label: string
  href: Href
  icon: IconName
  isCurrent: boolean
  /** Icon over word (bar, narrow rail) or beside it (wide rail). */
  isStacked: boolean
}

export function PlaceLink({ label, href, icon, isCurrent, isStacked }: Props) {
  const tint = isCurrent ? 'onAlgae' : 'muted'
  return (
    <PressLink
      href={href}
      isCurrent={isCurrent}
      look={({ hovered }) => [
        isStacked ? styles.stacked : styles.beside,
        hovered && !isCurrent ? styles.hovered : null,
        isCurrent && !isStacked ? styles.current : null,
      ]}
    >
      <View style={[isStacked ? styles.pill : null, isCurrent && isStacked ? styles.current : null]}>
        <Icon name={icon} tint={tint} />
      </View>
      <Text
        size={isStacked ? 'small' : 'body'}
        face={isCurrent ? 'strong' : 'body'}
        tint={isCurrent ? (isStacked ? 'ink' : 'onAlgae') : 'muted'}
      >
        {label}
      </Text>
    </PressLink>
  )
}

const styles = StyleSheet.create({
  stacked: { flex: 1, alignItems: 'center', justifyContent: 'center', gap: 2, minHeight: 60, minWidth: 64 },
  beside: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.md,
    minHeight: 48,
    paddingHorizontal: space.md,
    borderRadius: radius.tag,
  },
  pill: { paddingHorizontal: space.lg, paddingVertical: 3, borderRadius: radius.full },
  hovered: { backgroundColor: color.sunk },
  current: { backgroundColor: color.algae },
})
