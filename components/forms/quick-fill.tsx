import { Pressable, StyleSheet } from 'react-native'

import { Text } from '@/components/ui/text'
import { color, radius, space, touchPx } from '@/constants/theme'

interface Props {
  /** The answer it gives: "None". */
  answer: string
  /** Which field it answers, for readers. */
  fieldLabel: string
  onPress: () => void
}

/** The usual answer in one tap. */
export function QuickFill({ answer, fieldLabel, onPress }: Props) {
  return (
    <Pressable
      role="button"
      aria-label={`${answer}: ${fieldLabel}`}
      onPress={onPress}
      style={({ hovered }) => [styles.button, hovered ? styles.hovered : null]}
    >
      <Text size="note" face="strong" tint="netting">
        {answer}
      </Text>
    </Pressable>
  )
}

const styles = StyleSheet.create({
  button: {
    alignSelf: 'flex-start',
    justifyContent: 'center',
    minHeight: touchPx,
    paddingHorizontal: space.lg,
    borderRadius: radius.full,
    borderWidth: 1,
    borderColor: color.edge,
    backgroundColor: color.card,
  },
  hovered: { backgroundColor: color.sunk },
})
