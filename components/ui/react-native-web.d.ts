// react-native-web ships no types of its own.
declare module 'react-native-web' {
  export function unstable_createElement(tag: string, props: object): import('react').ReactElement
}
