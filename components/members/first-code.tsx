import { lazy, useEffect, useRef } from 'react'
import { StyleSheet, View } from 'react-native'

import { AccountForm } from '@/components/account/account-form'
import { refusalCode, refusalWords } from '@/components/account/refusal-words'
import { useTypedForm } from '@/components/account/use-typed-form'
import { Card } from '@/components/ui/card'
import { Field } from '@/components/ui/field'
import { Heading } from '@/components/ui/heading'
import { LazyPart } from '@/components/ui/lazy-part'
import { Text } from '@/components/ui/text'
import { space } from '@/constants/theme'
import { useAuthAct } from '@/hooks/use-auth'

const QrCode = lazy(() => import('./qr-code').then((module) => ({ default: module.QrCode })))

export interface Enrolment {
  totpURI: string
  backupCodes: string[]
}

interface Props {
  enrolment: Enrolment
  onProven: () => void
}

/** The secret goes into the app; the first code proves that it arrived there. */
export function FirstCode({ enrolment, onProven }: Props) {
  const box = useRef<View>(null)
  const verify = useAuthAct('verifyCode')
  const { values, field, refuse, summary, attempt } = useTypedForm({ code: '' })
  useEffect(() => box.current?.focus(), [])

  async function send() {
    const code = values.code.replace(/\s/g, '')
    if (refuse({ code: /^\d{6}$/.test(code) ? undefined : 'Six digits, please.' })) return
    try {
      await verify.mutateAsync({ code })
      onProven()
    } catch (error) {
      refuse({ [refusalCode(error) === 'INVALID_CODE' ? 'code' : 'form']: refusalWords(error) })
    }
  }

  return (
    <View style={styles.frame}>
      <View ref={box} tabIndex={-1}>
        <Heading level={2} size="lead">
          1. Put this into your app
        </Heading>
      </View>
      <Card>
        <LazyPart label="Drawing the code">
          <QrCode
            text={enrolment.totpURI}
            label="QR code for your app; the same secret is written below it"
          />
        </LazyPart>
        <View>
          <Text tint="muted">No camera at hand? Type this secret into the app:</Text>
          <Text face="strong" isFigures selectable style={styles.secret}>
            {secretOf(enrolment.totpURI)}
          </Text>
        </View>
      </Card>
      <Heading level={2} size="lead">
        2. Type the code it shows
      </Heading>
      <AccountForm
        label="First code"
        errors={summary}
        attempt={attempt}
        actLabel="Switch it on"
        busyLabel="Checking"
        isBusy={verify.isPending}
        onSend={() => void send()}
      >
        <Field
          {...field('code')}
          label="Code from your app"
          hint="Six digits. A new one shows every 30 seconds."
          inputMode="numeric"
          autoComplete="one-time-code"
          maxLength={7}
          enterKeyHint="go"
          onSubmitEditing={() => void send()}
        />
      </AccountForm>
    </View>
  )
}

/** In groups of four, as it is read out and typed. */
function secretOf(totpURI: string): string {
  const secret = new URL(totpURI).searchParams.get('secret') ?? ''
  return secret.replace(/(.{4})(?=.)/g, '$1 ')
}

const styles = StyleSheet.create({
  frame: { gap: space.lg },
  secret: { letterSpacing: 1, overflowWrap: 'anywhere' } as object,
})
