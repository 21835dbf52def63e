import { StyleSheet } from 'react-native'

import { webElement } from './web-element'

import { color, font, type } from '@/constants/theme'

interface Props {
  text: string
  controlId: string
  labelId: string
  note?: string
}

export function Label({ text, controlId, labelId, note }: Props) {
  const words = note
    ? [text, webElement('span', { key: 'note', style: styles.note, children: ` (${note})` })]
    : text
  return webElement('label', { htmlFor: controlId, id: labelId, style: styles.label, children: words })
}

const styles = StyleSheet.create({
  label: { ...type.body, ...font.strong, color: color.ink },
  note: { ...font.body, color: color.muted },
})
