import type { ReactNode } from 'react'
import { StyleSheet, View, type StyleProp, type ViewStyle } from 'react-native'

import { color, radius } from '@/constants/theme'

export type PieceSide = 'right' | 'bottom'

interface Props {
  /** The body carries the hole and the clipped corner, the stub tears off. */
  kind: 'body' | 'stub'
  /** The side of the body on which the stub hangs. */
  seam: PieceSide
  isHot?: boolean
  children: ReactNode
  style?: StyleProp<ViewStyle>
}

const cutPx = 22
const hole = { radiusPx: 7, xPx: 24, yPx: 24 }
const notchPx = 5

/**
 * One laminated piece, drawn as two layers: a sheet in the colour of the edge and, one pixel further in, the face.
 * Both are cut and punched by clip-path and mask, so the ground really shows through the hole.
 */
export function TagPiece({ kind, seam, isHot, children, style }: Props) {
  const pieceStyle = styles[`${kind}-${seam}`]
  return (
    <View style={style}>
      <View style={[styles.sheet, sheets[`${kind}-${seam}`], isHot ? styles.hot : null]} />
      <View style={[styles.face, pieceStyle, faces[`${kind}-${seam}`]]}>{children}</View>
    </View>
  )
}

interface Cut {
  kind: 'body' | 'stub'
  seam: PieceSide
  /** How far this layer lies inside the outline. */
  insetPx: number
}

function cutOut({ kind, seam, insetPx }: Cut): ViewStyle {
  const round = notchPx + insetPx
  const masks = notchPlaces(kind, seam, insetPx).map((place) => punch(round, place))
  if (kind === 'stub') return { maskImage: masks.join(', '), maskComposite: 'intersect' }
  const punched = punch(hole.radiusPx + insetPx, `${hole.xPx - insetPx}px ${hole.yPx - insetPx}px`)
  // On the slant an inset of one pixel moves the cut by two minus the square root of two.
  const cut = `${(cutPx - insetPx * (2 - Math.SQRT2)).toFixed(2)}px`
  return {
    clipPath: `polygon(${cut} 0, 100% 0, 100% 100%, 0 100%, 0 ${cut})`,
    maskImage: [punched, ...masks].join(', '),
    maskComposite: 'intersect',
  }
}

function punch(radiusPx: number, place: string): string {
  return `radial-gradient(circle at ${place}, transparent ${radiusPx - 0.3}px, #000 ${radiusPx + 0.3}px)`
}

function notchPlaces(kind: 'body' | 'stub', seam: PieceSide, insetPx: number): [string, string] {
  const seamAt = kind === 'body' ? '100%' : '0px'
  const near = `-${insetPx}px`
  const far = `calc(100% + ${insetPx}px)`
  return seam === 'right'
    ? [`${seamAt} ${near}`, `${seamAt} ${far}`]
    : [`${near} ${seamAt}`, `${far} ${seamAt}`]
}

const layer = (insetPx: number) =>
  StyleSheet.create({
    'body-right': cutOut({ kind: 'body', seam: 'right', insetPx }),
    'body-bottom': cutOut({ kind: 'body', seam: 'bottom', insetPx }),
    'stub-right': cutOut({ kind: 'stub', seam: 'right', insetPx }),
    'stub-bottom': cutOut({ kind: 'stub', seam: 'bottom', insetPx }),
  })
const sheets = layer(0)
const faces = layer(1)

const styles = StyleSheet.create({
  sheet: {
    position: 'absolute',
    top: 0,
    right: 0,
    bottom: 0,
    left: 0,
    backgroundColor: color.edge,
    borderRadius: radius.tag,
  },
  hot: { backgroundColor: color.netting },
  face: {
    flexGrow: 1,
    margin: 1,
    backgroundColor: color.card,
    borderRadius: radius.tag - 1,
    overflow: 'hidden',
  },
  'body-right': { marginRight: 0, borderTopRightRadius: 0, borderBottomRightRadius: 0 },
  'body-bottom': { marginBottom: 0, borderBottomLeftRadius: 0, borderBottomRightRadius: 0 },
  'stub-right': { marginLeft: 0, borderTopLeftRadius: 0, borderBottomLeftRadius: 0 },
  'stub-bottom': { marginTop: 0, borderTopLeftRadius: 0, borderTopRightRadius: 0 },
})
