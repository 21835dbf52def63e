import { usePathname } from 'expo-router'
import { StyleSheet, View } from 'react-native'

import { unreadBadge } from '@/components/notices/unread-badge'
import { Icon } from '@/components/ui/icon'
import { PressLink } from '@/components/ui/press-link'
import { Text } from '@/components/ui/text'
import { color, radius, space, touchPx } from '@/constants/theme'
import { useMe } from '@/hooks/use-me'
import { useUnread } from '@/hooks/use-unread'

/** The way to the notices, with how many wait; with its word where there is room. Visitors have none. */
export function NoticeBell({ hasWord = false }: { hasWord?: boolean }) {
  const { me } = useMe()
  const badge = unreadBadge(useUnread())
  const isCurrent = usePathname() === '/notices'
  if (!me) return null
  return (
    <PressLink
      href="/notices"
      label={badge ? `Notices, ${badge} unread` : 'Notices'}
      isCurrent={isCurrent}
      look={({ hovered }) => [
        styles.bell,
        hasWord ? styles.wide : null,
        hovered ? styles.hovered : null,
        isCurrent ? styles.current : null,
      ]}
    >
      <View>
        <Icon name="bell" tint={isCurrent ? 'onAlgae' : 'muted'} />
        {badge ? (
          <View style={styles.count}>
            <Text size="small" face="strong" tint="onAlgae">
              {badge}
            </Text>
          </View>
        ) : null}
      </View>
      {hasWord ? <Text tint={isCurrent ? 'onAlgae' : 'muted'}>Notices</Text> : null}
    </PressLink>
  )
}

const styles = StyleSheet.create({
  bell: {
    minWidth: touchPx,
    minHeight: touchPx,
    alignItems: 'center',
    justifyContent: 'center',
    borderRadius: radius.tag,
  },
  wide: {
    flexDirection: 'row',
    justifyContent: 'flex-start',
    gap: space.md,
    paddingHorizontal: space.md,
    minHeight: 48,
  },
  hovered: { backgroundColor: color.sunk },
  current: { backgroundColor: color.algae },
  count: {
    position: 'absolute',
    top: -8,
    left: 12,
    minWidth: 20,
    height: 20,
    paddingHorizontal: 4,
    alignItems: 'center',
    justifyContent: 'center',
    borderRadius: radius.full,
    backgroundColor: color.algae,
    borderWidth: 1,
    borderColor: color.card,
  },
})
