import { useState } from 'react'
import { StyleSheet, View } from 'react-native'

import { Icon } from './icon'
import { webElement } from './web-element'

import { color } from '@/constants/theme'

export interface PhotoProps {
  uri: string
  /** What the picture shows. */
  label: string
  /** Width over height; leave off to fill the parent. */
  ratio?: number
  /** The picture's mean colour, shown until it has loaded. */
  meanColor?: string
  /** The first picture of a page loads at once. */
  isFirst?: boolean
}

export function Photo({ uri, label, ratio, meanColor, isFirst }: PhotoProps) {
  const [failedUri, setFailedUri] = useState('')
  const box = [
    styles.box,
    ratio ? { aspectRatio: ratio } : styles.fill,
    meanColor ? { backgroundColor: meanColor } : null,
  ]
  if (failedUri === uri) {
    return (
      <View role="img" aria-label={`${label} (could not be loaded)`} style={[box, styles.centre]}>
        <Icon name="camera" tint="muted" />
      </View>
    )
  }
  return (
    <View style={box}>
      {webElement('img', {
        src: uri,
        alt: label,
        loading: isFirst ? 'eager' : 'lazy',
        decoding: 'async',
        draggable: false,
        onError: () => setFailedUri(uri),
        style: styles.picture,
      })}
    </View>
  )
}

const styles = StyleSheet.create({
  box: { backgroundColor: color.sunk, overflow: 'hidden' },
  fill: { width: '100%', height: '100%' },
  centre: { alignItems: 'center', justifyContent: 'center' },
  picture: { position: 'absolute', top: 0, left: 0, width: '100%', height: '100%', objectFit: 'cover' },
})
