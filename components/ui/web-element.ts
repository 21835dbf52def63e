import type { ReactElement } from 'react'
import { unstable_createElement as createElement } from 'react-native-web'

// A real DOM element that takes React Native styles. Only for files with a .native twin.
export function webElement(tag: string, props: object): ReactElement {
  return createElement(tag, props)
}
