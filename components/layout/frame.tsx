import { router, useNavigationContainerRef, useSegments } from 'expo-router'
import { useEffect, type ReactNode } from 'react'
import { StyleSheet, View } from 'react-native'

import { PhoneBar } from './phone-bar'
import { Rail } from './rail'
import { SkipLink } from './skip-link'

import { color } from '@/constants/theme'
import { useAccountTheme } from '@/hooks/use-account-theme'
import { useBreakpoint } from '@/hooks/use-breakpoint'

/** The rail stands beside every page; the phone's bar only under the places themselves. */
export function Frame({ children }: { children: ReactNode }) {
  const breakpoint = useBreakpoint()
  useNotedFirstPage()
  useAccountTheme()
  const isAtPlace = useSegments()[0] === '(tabs)'
  return (
    <View style={[styles.frame, breakpoint === 'phone' ? styles.column : styles.row]}>
      <SkipLink />
      {breakpoint === 'phone' ? null : <Rail isNarrow={breakpoint === 'middle'} />}
      <View style={styles.page}>{children}</View>
      {breakpoint === 'phone' && isAtPlace ? <PhoneBar /> : null}
    </View>
  )
}

// The router notes the page a visit starts with before that page has its keys, and would build it anew, unscrolled,
// when the browser comes back to it. A change of nothing makes it take the note again.
function useNotedFirstPage() {
  const navigation = useNavigationContainerRef()
  useEffect(() => navigation.addListener('ready', () => router.setParams({})), [navigation])
}

const styles = StyleSheet.create({
  frame: { flex: 1, backgroundColor: color.mist },
  row: { flexDirection: 'row' },
  column: { flexDirection: 'column' },
  page: { flex: 1, minWidth: 0 },
})
