import { StyleSheet, Text } from 'react-native'

interface Props {
  children: string
  nativeID?: string
  isLive?: boolean
}

/** For screen readers only. */
export function HiddenText({ children, nativeID, isLive }: Props) {
  return (
    <Text nativeID={nativeID} role={isLive ? 'status' : undefined} style={styles.hidden}>
      {children}
    </Text>
  )
}

const styles = StyleSheet.create({
  hidden: {
    position: 'absolute',
    width: 1,
    height: 1,
    margin: -1,
    overflow: 'hidden',
    clipPath: 'inset(50%)',
  },
})
