import { Pressable, StyleSheet, View } from 'react-native'

import { Icon } from '@/components/ui/icon'
import { Text } from '@/components/ui/text'
import { color, radius, space, touchPx } from '@/constants/theme'

interface Props {
  title: string
  /** How many answers of the step need another look. */
  missing: number
  onPress: () => void
}

/** One step in the list before publishing: complete, or what is open. One tap goes there. */
export function StepState({ title, missing, onPress }: Props) {
  const isWhole = missing === 0
  const words = isWhole ? 'complete' : missing === 1 ? '1 thing open' : `${missing} things open`
  return (
    <View role="listitem">
      <Pressable
        role="link"
        onPress={onPress}
        style={({ hovered }) => [styles.row, hovered ? styles.hovered : null]}
      >
        <Icon name={isWhole ? 'check' : 'edit'} sizePx={20} tint={isWhole ? 'safe' : 'warm'} />
        <Text style={styles.title}>{title}</Text>
        <Text size="note" tint={isWhole ? 'muted' : 'warm'}>
          {words}
        </Text>
        <Icon name="forward" sizePx={18} tint="muted" />
      </Pressable>
    </View>
  )
}

const styles = StyleSheet.create({
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.md,
    minHeight: touchPx + 4,
    paddingHorizontal: space.md,
    borderRadius: radius.tag,
    borderWidth: 1,
    borderColor: color.line,
    backgroundColor: color.card,
  },
  hovered: { backgroundColor: color.sunk },
  title: { flex: 1 },
})
