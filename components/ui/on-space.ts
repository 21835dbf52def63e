import type { WebKeyEvent } from './web-key-event'

/** Key handler for controls that react-native-web presses by Enter only: a checkbox or a switch answers to Space. */
export function onSpace(act: () => void) {
  return (event: WebKeyEvent) => {
    if (event.nativeEvent.key !== ' ') return
    event.preventDefault() // or the page would scroll
    act()
  }
}
