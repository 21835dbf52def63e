import { useIsFocused } from 'expo-router'
import { useEffect, useEffectEvent, useRef } from 'react'
import { StyleSheet, View } from 'react-native'

import { Heading } from '@/components/ui/heading'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { useBreakpoint } from '@/hooks/use-breakpoint'

interface Props {
  heading: string
  intro?: string
  isHidden?: boolean
}

let lastHeading = ''

/** The one h1. A page that comes into view takes the keyboard here, so that its name is read out. */
export function PageTitle({ heading, intro, isHidden }: Props) {
  const box = useRef<View>(null)
  const isInView = useIsFocused()
  const isPhone = useBreakpoint() === 'phone'
  const arrive = useEffectEvent(() => {
    // Neither on the first page nor when a page is drawn anew under its own name, its parts having arrived.
    if (lastHeading !== '' && lastHeading !== heading) box.current?.focus()
    lastHeading = heading
  })
  useEffect(() => {
    if (isInView) arrive()
  }, [isInView])
  return (
    <View ref={box} tabIndex={-1} style={isHidden ? styles.hidden : styles.title}>
      <Heading level={1} size={isPhone ? 'title' : 'hero'}>
        {heading}
      </Heading>
      {intro ? (
        <Text tint="muted" style={styles.intro}>
          {intro}
        </Text>
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({
  title: { gap: space.sm },
  intro: { maxWidth: 640 },
  hidden: { position: 'absolute', width: 1, height: 1, overflow: 'hidden', clipPath: 'inset(50%)' },
})
