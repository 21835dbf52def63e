import { useEffect, useRef, useState } from 'react'
import { StyleSheet, View } from 'react-native'

import { refusalWords } from './refusal-words'

import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Heading } from '@/components/ui/heading'
import { Link } from '@/components/ui/link'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { useAuthAct } from '@/hooks/use-auth'

interface Props {
  email: string
  why: 'signed-up' | 'not-confirmed'
}

const openings = {
  'signed-up': 'If this address is new to us, a mail with a link is on its way. The link works for one hour.',
  'not-confirmed':
    'Your address is not confirmed yet. We have just sent the link again; it works for one hour.',
}

/** The same words whether the address was new or known: who has an account stays private. */
export function MailboxNotice({ email, why }: Props) {
  const box = useRef<View>(null)
  const resend = useAuthAct('resendVerification')
  const [said, setSaid] = useState<{ isGood: boolean; text: string } | null>(null)
  useEffect(() => box.current?.focus(), [])

  async function sendAgain() {
    try {
      await resend.mutateAsync({ email, callbackURL: '/verify-email' })
      setSaid({ isGood: true, text: 'Sent again. It can take a minute or two to arrive.' })
    } catch (error) {
      setSaid({ isGood: false, text: refusalWords(error) })
    }
  }

  return (
    <View style={styles.frame}>
      <View ref={box} tabIndex={-1}>
        <Heading level={2}>Look into your mailbox</Heading>
      </View>
      <Text>{openings[why]}</Text>
      <Text>
        We wrote to <Text face="strong">{email}</Text>. If nothing comes within a few minutes, look into the
        folder for unwanted mail. If you already have an account with this address, the mail says so.
      </Text>
      {said ? <Banner isLive tone={said.isGood ? 'safe' : 'danger'} title={said.text} /> : null}
      <Button
        kind="secondary"
        icon="mail"
        label="Send the mail again"
        busyLabel="Sending"
        isBusy={resend.isPending}
        onPress={() => void sendAgain()}
      />
      <Link href="/sign-in">Back to sign in</Link>
    </View>
  )
}

const styles = StyleSheet.create({ frame: { gap: space.lg, maxWidth: 560 } })
