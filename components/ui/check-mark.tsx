import { StyleSheet, View } from 'react-native'

import { Icon } from './icon'

import { color, radius } from '@/constants/theme'

interface Props {
  shape: 'box' | 'dot'
  isOn: boolean
  isRefused?: boolean
}

export function CheckMark({ shape, isOn, isRefused }: Props) {
  return (
    <View
      style={[
        styles.mark,
        shape === 'dot' ? styles.round : null,
        isOn ? styles.on : null,
        isRefused ? styles.refused : null,
      ]}
    >
      {isOn && shape === 'box' ? <Icon name="check" sizePx={18} tint="onAlgae" /> : null}
      {isOn && shape === 'dot' ? <View style={styles.dot} /> : null}
    </View>
  )
}

const styles = StyleSheet.create({
  mark: {
    width: 24,
    height: 24,
    borderWidth: 2,
    borderRadius: radius.tag,
    borderColor: color.edge,
    backgroundColor: color.card,
    alignItems: 'center',
    justifyContent: 'center',
  },
  round: { borderRadius: 12 },
  on: { backgroundColor: color.algae, borderColor: color.ink },
  refused: { borderColor: color.danger },
  dot: { width: 10, height: 10, borderRadius: 5, backgroundColor: color.onAlgae },
})
