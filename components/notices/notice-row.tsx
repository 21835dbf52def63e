import { StyleSheet, View } from 'react-native'

import { noticeHref, noticeIcon } from './notice-look'

import { Badge } from '@/components/ui/badge'
import { Icon } from '@/components/ui/icon'
import { PressLink } from '@/components/ui/press-link'
import { Text } from '@/components/ui/text'
import { color, radius, space } from '@/constants/theme'
import { useReadNotice } from '@/hooks/use-notices'
import type { ShownNotice } from '@/shared/contracts/notices'
import { printMoment } from '@/shared/times/print-time'

/** One notice; following it marks it read. */
export function NoticeRow({ notice, zone }: { notice: ShownNotice; zone: string }) {
  const read = useReadNotice()
  const isNew = notice.readAt === undefined
  return (
    <PressLink
      href={noticeHref(notice)}
      onFollow={isNew ? () => read.mutate(notice.noticeId) : undefined}
      look={({ pressed, hovered }) => [styles.row, pressed || hovered ? styles.pressed : null]}
    >
      <Icon name={noticeIcon(notice.kind)} tint={isNew ? 'netting' : 'muted'} />
      <View style={styles.words}>
        <Text face={isNew ? 'strong' : 'body'}>{notice.subject}</Text>
        <Text size="note" tint="muted">
          {notice.title}
        </Text>
        <View style={styles.foot}>
          <Text size="note" tint="muted">
            {printMoment(notice.createdAt, zone)}
          </Text>
          {isNew ? <Badge word="New" tone="today" /> : null}
        </View>
      </View>
    </PressLink>
  )
}

const styles = StyleSheet.create({
  row: {
    flexDirection: 'row',
    gap: space.md,
    padding: space.lg,
    borderRadius: radius.tag,
    backgroundColor: color.card,
    borderWidth: 1,
    borderColor: color.line,
  },
  pressed: { backgroundColor: color.sunk },
  words: { flex: 1, gap: 2, minWidth: 0 },
  foot: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', gap: space.md },
})
