import type { ReactNode } from 'react'
import { StyleSheet, View } from 'react-native'

import { Button } from '@/components/ui/button'
import { ErrorSummary, type FormError } from '@/components/ui/error-summary'
import { space } from '@/constants/theme'

interface Props {
  /** Names the form for readers: "Sign in". */
  label: string
  errors: readonly FormError[]
  attempt: number
  children: ReactNode
  actLabel: string
  busyLabel: string
  isBusy: boolean
  onSend: () => void
}

export function AccountForm({
  label,
  errors,
  attempt,
  children,
  actLabel,
  busyLabel,
  isBusy,
  onSend,
}: Props) {
  return (
    <View role="form" aria-label={label} style={styles.form}>
      <ErrorSummary errors={errors} attempt={attempt} />
      {children}
      <Button label={actLabel} busyLabel={busyLabel} isBusy={isBusy} isWide onPress={onSend} />
    </View>
  )
}

const styles = StyleSheet.create({ form: { gap: space.lg, maxWidth: 480, width: '100%' } })
