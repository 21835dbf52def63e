/** A key press as react-native-web hands it on. */
export interface WebKeyEvent {
  nativeEvent: { key: string; shiftKey: boolean; ctrlKey: boolean; metaKey: boolean; altKey: boolean }
  preventDefault: () => void
  stopPropagation: () => void
}
