import { StyleSheet, View } from 'react-native'
import Svg, { Path } from 'react-native-svg'

import { qrPath } from './qr-path'

interface Props {
  text: string
  label: string
}

const sizePx = 208

export function QrCode({ text, label }: Props) {
  const { path, size } = qrPath(text)
  return (
    <View role="img" aria-label={label} style={styles.paper}>
      <Svg width={sizePx} height={sizePx} viewBox={`0 0 ${size} ${size}`}>
        <Path d={path} fill="#000000" />
      </Svg>
    </View>
  )
}

const styles = StyleSheet.create({ paper: { backgroundColor: '#FFFFFF', alignSelf: 'flex-start' } })
