import { useRouter, type Href } from 'expo-router'
import { useState } from 'react'
import { StyleSheet, View } from 'react-native'

import { AccountForm } from './account-form'
import { refusalCode, refusalWords } from './refusal-words'
import { useTypedForm } from './use-typed-form'

import { Button } from '@/components/ui/button'
import { Field } from '@/components/ui/field'
import { Link } from '@/components/ui/link'
import { space } from '@/constants/theme'
import { useAuthAct } from '@/hooks/use-auth'

interface Props {
  returnTo: Href
}

/** The code that follows the password: from the app, or one of the backup codes. */
export function SecondFactorForm({ returnTo }: Props) {
  const router = useRouter()
  const [way, setWay] = useState<'app' | 'backup'>('app')
  const verifyCode = useAuthAct('verifyCode')
  const verifyBackupCode = useAuthAct('verifyBackupCode')
  const { values, field, refuse, summary, attempt } = useTypedForm({ app: '', backup: '' })
  const act = way === 'app' ? verifyCode : verifyBackupCode

  async function send() {
    const code = way === 'app' ? values.app.replace(/\s/g, '') : values.backup.trim()
    if (way === 'app' && !/^\d{6}$/.test(code)) {
      refuse({ app: 'Six digits, please.' })
      return
    }
    if (refuse({ [way]: code === '' ? 'Please type one of your backup codes.' : undefined })) return
    try {
      await act.mutateAsync({ code })
      router.replace(returnTo)
    } catch (error) {
      const isOfField = refusalCode(error).startsWith('INVALID_') && !refusalCode(error).endsWith('COOKIE')
      refuse({ [isOfField ? way : 'form']: refusalWords(error) })
    }
  }

  return (
    <View style={styles.frame}>
      <AccountForm
        label="Second factor"
        errors={summary}
        attempt={attempt}
        actLabel="Go on"
        busyLabel="Checking"
        isBusy={act.isPending}
        onSend={() => void send()}
      >
        {way === 'app' ? (
          <Field
            {...field('app')}
            label="Code from your app"
            hint="Six digits. A new one shows every 30 seconds."
            inputMode="numeric"
            autoComplete="one-time-code"
            maxLength={7}
            enterKeyHint="go"
            onSubmitEditing={() => void send()}
          />
        ) : (
          <Field
            {...field('backup')}
            label="Backup code"
            hint="One of the ten you wrote down. Each works once; capital letters matter."
            autoComplete="off"
            autoCapitalize="none"
            spellCheck={false}
            enterKeyHint="go"
            onSubmitEditing={() => void send()}
          />
        )}
      </AccountForm>
      <Button
        kind="quiet"
        label={way === 'app' ? 'Use a backup code instead' : 'Use the app instead'}
        onPress={() => setWay(way === 'app' ? 'backup' : 'app')}
      />
      <Link href="/sign-in">Start again with e-mail and password</Link>
    </View>
  )
}

const styles = StyleSheet.create({ frame: { gap: space.lg, alignItems: 'flex-start' } })
