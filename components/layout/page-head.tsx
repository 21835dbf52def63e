import { useRouter, type Href } from 'expo-router'
import type { ReactNode } from 'react'
import { StyleSheet, View } from 'react-native'
import { useSafeAreaInsets } from 'react-native-safe-area-context'

import { Brand } from './brand'
import { NoticeBell } from './notice-bell'

import { IconButton } from '@/components/ui/icon-button'
import { Text } from '@/components/ui/text'
import { color, space } from '@/constants/theme'

export interface PageBack {
  /** Where it leads: "Back to orders". */
  label: string
  /** Taken when the page was opened directly and there is nothing to go back to. */
  href: Href
}

interface Props {
  title: string
  back?: PageBack
  actions?: ReactNode
  isPhone: boolean
}

/** The strip over a page: the sign on a phone's places, a way back everywhere else. */
export function PageHead({ title, back, actions, isPhone }: Props) {
  const router = useRouter()
  const { top } = useSafeAreaInsets()
  if (!back && !isPhone && !actions) return null
  return (
    <View
      dataSet={{ screenOnly: '' }}
      style={[styles.head, { paddingTop: top }, isPhone && back ? styles.ruled : null]}
    >
      {back ? (
        <IconButton
          icon="back"
          label={back.label}
          onPress={() => (router.canGoBack() ? router.back() : router.replace(back.href))}
        />
      ) : null}
      {!back && isPhone ? (
        <View style={styles.brand}>
          <Brand />
        </View>
      ) : null}
      <View style={styles.middle}>
        {back ? (
          <Text size="note" tint="muted" numberOfLines={1} aria-hidden>
            {isPhone ? title : back.label}
          </Text>
        ) : null}
      </View>
      {actions}
      {!back && isPhone ? <NoticeBell /> : null}
    </View>
  )
}

const styles = StyleSheet.create({
  head: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.xs,
    minHeight: 56,
    paddingHorizontal: space.sm,
  },
  ruled: { backgroundColor: color.card, borderBottomWidth: 1, borderBottomColor: color.line },
  brand: { paddingLeft: space.sm },
  middle: { flex: 1, minWidth: 0 },
})
