import { useEffect, useRef } from 'react'
import { Platform, StyleSheet, View } from 'react-native'

import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { ButtonLink } from '@/components/ui/button-link'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { Text } from '@/components/ui/text'
import { useToast } from '@/components/ui/toast'
import { space } from '@/constants/theme'

const canCopy = Platform.OS === 'web' && 'clipboard' in navigator

/** Shown once, right after switching on: the server keeps them only unreadable. */
export function BackupCodes({ codes }: { codes: readonly string[] }) {
  const box = useRef<View>(null)
  const toast = useToast()
  useEffect(() => box.current?.focus(), [])
  async function copy() {
    try {
      await navigator.clipboard.writeText(codes.join('\n'))
      toast({ text: 'Copied. Keep them where only you can look.', tone: 'safe' })
    } catch {
      toast({ text: 'Your browser did not allow copying. Write them down instead.', tone: 'danger' })
    }
  }
  return (
    <View style={styles.frame}>
      <Banner tone="safe" icon="shield" title="Your second factor is on">
        From now on signing in asks for a code after the password.
      </Banner>
      <View ref={box} tabIndex={-1}>
        <Heading level={2} size="lead">
          Keep these backup codes
        </Heading>
      </View>
      <Text>
        Each opens your account once when your phone is lost. They are shown this one time only: write them
        down or print them.
      </Text>
      <Card>
        <View role="list" style={styles.codes}>
          {codes.map((code) => (
            <View key={code} role="listitem" style={styles.code}>
              <Text face="strong" isFigures selectable>
                {code}
              </Text>
            </View>
          ))}
        </View>
      </Card>
      <View style={styles.acts}>
        {canCopy ? <Button kind="secondary" label="Copy all" onPress={() => void copy()} /> : null}
        {Platform.OS === 'web' ? (
          <Button kind="secondary" icon="print" label="Print" onPress={() => window.print()} />
        ) : null}
        <ButtonLink href="/me" label="I have kept them" />
      </View>
    </View>
  )
}

const styles = StyleSheet.create({
  frame: { gap: space.lg },
  codes: { flexDirection: 'row', flexWrap: 'wrap', rowGap: space.sm },
  code: { width: '50%' },
  acts: { flexDirection: 'row', flexWrap: 'wrap', gap: space.md },
})
