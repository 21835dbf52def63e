import { View, StyleSheet } from 'react-native'

import { QuietHoursSetting } from './quiet-hours-setting'

import { ButtonLink } from '@/components/ui/button-link'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { Switch } from '@/components/ui/switch'
import { Text } from '@/components/ui/text'
import { useToast } from '@/components/ui/toast'
import { space } from '@/constants/theme'
import { useChangeMe } from '@/hooks/use-me'
import type { Me } from '@/shared/contracts/members'

/** What comes by mail and when; the notices themselves stand inside the product either way. */
export function MailSetting({ mail }: Pick<Me, 'mail'>) {
  const change = useChangeMe()
  const toast = useToast()
  return (
    <Card>
      <Heading level={2} size="lead">
        Notices by mail
      </Heading>
      <Text tint="muted">
        Mails about your money and about a changed order always come. Reminders are yours to choose.
      </Text>
      <Switch
        label="Reminders before a pickup"
        hint="The evening before, and two hours before."
        isOn={change.isPending ? (change.variables.reminders ?? mail.reminders) : mail.reminders}
        onChange={(reminders) =>
          change.mutate({ reminders }, { onError: ({ message }) => toast({ text: message, tone: 'danger' }) })
        }
      />
      {mail.reminders ? <QuietHoursSetting quiet={mail.quiet} /> : null}
      <View style={styles.link}>
        <ButtonLink kind="secondary" icon="bell" href="/notices" label="Your notices" />
      </View>
    </Card>
  )
}

const styles = StyleSheet.create({ link: { flexDirection: 'row', paddingTop: space.xs } })
