import type { ReactNode } from 'react'
import { Modal, Pressable, ScrollView, StyleSheet, useWindowDimensions, View } from 'react-native'

import { Heading } from './heading'
import { IconButton } from './icon-button'

import { breakpointOf, color, radius, space } from '@/constants/theme'

interface Props {
  title: string
  isOpen: boolean
  onClose: () => void
  children: ReactNode
  /** The act of the sheet, always in reach at the bottom. */
  footer?: ReactNode
  /** On wider screens: a panel at the side, or a dialog in the middle. On a phone the panel
   *  fills the screen and the dialog stands at its foot. */
  shape?: 'panel' | 'dialog'
}

export function Sheet({ title, isOpen, onClose, children, footer, shape = 'panel' }: Props) {
  const isPhone = breakpointOf(useWindowDimensions().width) === 'phone'
  const place = isPhone ? (shape === 'panel' ? styles.full : styles.low) : styles[shape]
  return (
    <Modal visible={isOpen} transparent animationType="none" onRequestClose={onClose} aria-label={title}>
      <View style={[styles.back, shape === 'dialog' ? (isPhone ? styles.atFoot : styles.centre) : null]}>
        <View
          style={[styles.sheet, place]}
          dataSet={{ enter: isPhone ? 'up' : shape === 'panel' ? 'side' : 'fade' }}
        >
          <View style={styles.head}>
            {/* The keyboard lands here first, so that the sheet's name is read out. */}
            <View tabIndex={-1} style={styles.title}>
              <Heading level={2} size="lead">
                {title}
              </Heading>
            </View>
            <IconButton icon="close" label={`Close ${title}`} onPress={onClose} />
          </View>
          <ScrollView style={styles.scroll} contentContainerStyle={styles.body}>
            {children}
          </ScrollView>
          {footer ? <View style={styles.foot}>{footer}</View> : null}
        </View>
        <Pressable style={styles.scrim} onPress={onClose} tabIndex={-1} aria-hidden />
      </View>
    </Modal>
  )
}

const styles = StyleSheet.create({
  back: { flex: 1, flexDirection: 'row', justifyContent: 'flex-end' },
  atFoot: { alignItems: 'flex-end' },
  centre: { justifyContent: 'center', alignItems: 'center' },
  scrim: { position: 'absolute', top: 0, right: 0, bottom: 0, left: 0, backgroundColor: color.scrim },
  sheet: { zIndex: 1, backgroundColor: color.mist, maxHeight: '100%' },
  full: { width: '100%', height: '100%' },
  low: { width: '100%', maxHeight: '90%', borderTopWidth: 2, borderTopColor: color.ink },
  panel: { width: 440, height: '100%', borderLeftWidth: 1, borderLeftColor: color.edge },
  dialog: { width: 560, maxHeight: '90%', borderRadius: radius.tag, borderWidth: 1, borderColor: color.edge },
  head: {
    flexDirection: 'row',
    alignItems: 'center',
    paddingLeft: space.lg,
    paddingRight: space.sm,
    paddingVertical: space.sm,
    borderBottomWidth: 1,
    borderBottomColor: color.line,
  },
  title: { flex: 1 },
  scroll: { flexShrink: 1, flexGrow: 1 },
  body: { padding: space.lg, gap: space.lg },
  foot: {
    padding: space.lg,
    gap: space.sm,
    borderTopWidth: 1,
    borderTopColor: color.line,
    backgroundColor: color.card,
  },
})
