import { useState } from 'react'
import { Image, StyleSheet, View } from 'react-native'

import { Icon } from './icon'

import { color } from '@/constants/theme'

export interface PhotoProps {
  uri: string
  label: string
  ratio?: number
  meanColor?: string
  isFirst?: boolean
}

export function Photo({ uri, label, ratio, meanColor }: PhotoProps) {
  const [failedUri, setFailedUri] = useState('')
  const box = [
    styles.box,
    ratio ? { aspectRatio: ratio } : styles.fill,
    meanColor ? { backgroundColor: meanColor } : null,
  ]
  return (
    <View style={box}>
      {failedUri === uri ? (
        <Icon name="camera" tint="muted" />
      ) : (
        <Image
          source={{ uri }}
          alt={label}
          resizeMode="cover"
          onError={() => setFailedUri(uri)}
          style={styles.fill}
        />
      )}
    </View>
  )
}

const styles = StyleSheet.create({
  box: { backgroundColor: color.sunk, overflow: 'hidden', alignItems: 'center', justifyContent: 'center' },
  fill: { width: '100%', height: '100%' },
})
