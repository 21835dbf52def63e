import { StyleSheet } from 'react-native'

import { webElement } from '@/components/ui/web-element'
import { color, font, type } from '@/constants/theme'

/** The first stop of the keyboard: past the places, into the page that is showing. */
export function SkipLink() {
  return webElement('a', {
    href: '#content',
    dataSet: { skip: '' },
    style: styles.link,
    onClick: (event: { preventDefault: () => void }) => {
      event.preventDefault()
      document.getElementById('content')?.focus()
    },
    children: 'Skip to the page',
  })
}

const styles = StyleSheet.create({
  link: {
    ...type.body,
    ...font.strong,
    paddingHorizontal: 16,
    paddingVertical: 10,
    color: color.onPrimary,
    backgroundColor: color.primary,
    borderRadius: 4,
  },
})
