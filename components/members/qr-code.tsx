import { StyleSheet, View } from 'react-native'

import { qrPath } from './qr-path'

interface Props {
  text: string
  label: string
}

const sizePx = 208

/** Always dark on white, whatever the theme: cameras expect it so. */
export function QrCode({ text, label }: Props) {
  const { path, size } = qrPath(text)
  return (
    <View role="img" aria-label={label} style={styles.paper}>
      <svg width={sizePx} height={sizePx} viewBox={`0 0 ${size} ${size}`} aria-hidden focusable={false}>
        <path d={path} fill="#000000" shapeRendering="crispEdges" />
      </svg>
    </View>
  )
}

const styles = StyleSheet.create({ paper: { backgroundColor: '#FFFFFF', alignSelf: 'flex-start' } })
