import { useIsFocused } from 'expo-router'
import type { ReactNode } from 'react'
import { ScrollView, StyleSheet, View } from 'react-native'
import { useSafeAreaInsets } from 'react-native-safe-area-context'

import { PageHead, type PageBack } from './page-head'
import { PageTitle } from './page-title'
import { usePageTitle } from './use-page-title'

import { color, layout, space } from '@/constants/theme'
import { useBreakpoint } from '@/hooks/use-breakpoint'

interface Props {
  /** The browser tab, and the one h1 unless `heading` says it better. */
  title: string
  heading?: string
  isHeadingHidden?: boolean
  intro?: string
  back?: PageBack
  /** Small buttons at the right of the head. */
  actions?: ReactNode
  /** readable: forms and texts; page: most screens; full: columns that touch the edges. */
  width?: 'readable' | 'page' | 'full'
  /** The page's main act, in thumb reach at the bottom. */
  footer?: ReactNode
  /** False when the children scroll themselves (lists, columns). */
  isScrolled?: boolean
  children: ReactNode
}

export function Page(props: Props) {
  const { title, heading = title, isHeadingHidden, intro, width = 'page', isScrolled = true, footer } = props
  const isPhone = useBreakpoint() === 'phone'
  const isInView = useIsFocused()
  usePageTitle(title, isInView)
  const { bottom } = useSafeAreaInsets()
  const body = (
    <View
      style={[
        styles.body,
        styles[width],
        isPhone ? styles.phone : styles.roomy,
        isScrolled ? null : styles.unscrolled,
      ]}
    >
      <PageTitle heading={heading} intro={intro} isHidden={isHeadingHidden} />
      {props.children}
    </View>
  )
  return (
    <View
      role="main"
      tabIndex={-1}
      nativeID={isInView ? 'content' : undefined}
      inert={!isInView}
      style={styles.main}
    >
      <PageHead title={heading} back={props.back} actions={props.actions} isPhone={isPhone} />
      {isScrolled ? <ScrollView style={styles.fill}>{body}</ScrollView> : body}
      {footer ? (
        <View dataSet={{ screenOnly: '' }} style={[styles.foot, { paddingBottom: space.md + bottom }]}>
          {footer}
        </View>
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({
  main: { flex: 1, backgroundColor: color.mist, minWidth: 0 },
  fill: { flex: 1, minHeight: 0 },
  body: { width: '100%', gap: space.lg, alignSelf: 'center' },
  phone: { paddingHorizontal: space.lg, paddingTop: space.lg, paddingBottom: space.xxl },
  roomy: { paddingHorizontal: space.xl, paddingTop: space.xl, paddingBottom: space.huge },
  readable: { maxWidth: layout.readablePx + 2 * space.xl },
  page: { maxWidth: layout.pagePx + 2 * space.xl },
  full: {},
  unscrolled: { flex: 1, minHeight: 0, paddingBottom: 0 },
  foot: {
    paddingHorizontal: space.lg,
    paddingTop: space.md,
    gap: space.sm,
    backgroundColor: color.card,
    borderTopWidth: 1,
    borderTopColor: color.line,
  },
})
