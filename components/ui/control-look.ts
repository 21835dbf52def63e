import { StyleSheet } from 'react-native'

import { color, font, radius, space, touchPx, type } from '@/constants/theme'

/** The box every typed or chosen value sits in. */
export const controlStyles = StyleSheet.create({
  box: {
    ...type.body,
    ...font.body,
    minHeight: touchPx + 4,
    color: color.ink,
    backgroundColor: color.card,
    borderColor: color.edge,
    borderWidth: 1,
    borderStyle: 'solid',
    borderRadius: radius.tag,
    paddingHorizontal: space.md,
    paddingVertical: space.sm,
  },
  refused: { borderColor: color.danger, borderWidth: 2, paddingHorizontal: space.md - 1 },
  off: { backgroundColor: color.sunk, color: color.muted },
})
