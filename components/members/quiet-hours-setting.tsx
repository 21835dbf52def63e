import { useState } from 'react'
import { StyleSheet, View } from 'react-native'

import { Button } from '@/components/ui/button'
import { Switch } from '@/components/ui/switch'
import { TimeField } from '@/components/ui/time-field'
import { useToast } from '@/components/ui/toast'
import { space } from '@/constants/theme'
import { useChangeMe } from '@/hooks/use-me'
import type { Me } from '@/shared/contracts/members'
import { zoneWords } from '@/shared/times/zone-words'

type Quiet = Me['mail']['quiet']

const FIRST = { from: '22:00', until: '07:00' }
const TIME = /^([01]\d|2[0-3]):[0-5]\d$/

function faultOf({ from, until }: { from: string; until: string }): string | undefined {
  if (!TIME.test(from) || !TIME.test(until)) return 'A time such as 22:00, please.'
  return from === until ? 'The end must differ from the beginning.' : undefined
}

/** Hours without reminders, on the clock of the place this device is in. */
export function QuietHoursSetting({ quiet }: { quiet: Quiet }) {
  const [typed, setTyped] = useState({ from: quiet?.from ?? FIRST.from, until: quiet?.until ?? FIRST.until })
  const change = useChangeMe()
  const toast = useToast()
  const { timeZone: zone } = new Intl.DateTimeFormat().resolvedOptions()
  const fault = faultOf(typed)
  const isKept = quiet?.from === typed.from && quiet.until === typed.until
  function keep(wanted: NonNullable<Quiet> | null) {
    change.mutate(
      { quiet: wanted },
      {
        onSuccess: () => toast({ text: wanted ? 'Quiet hours kept.' : 'Quiet hours are off.', tone: 'safe' }),
        onError: ({ message }) => toast({ text: message, tone: 'danger' }),
      },
    )
  }
  return (
    <View style={styles.frame}>
      <Switch
        label="Quiet hours"
        hint={`Reminders wait until they end (${zoneWords(quiet?.zone ?? zone)}). A pickup that is near still reminds you on time.`}
        isOn={quiet !== undefined}
        isDisabled={change.isPending}
        onChange={(isOn) => keep(isOn ? { ...(fault ? FIRST : typed), zone } : null)}
      />
      {quiet ? (
        <View style={styles.times}>
          <View style={styles.time}>
            <TimeField
              label="From"
              value={typed.from}
              onChange={(from) => setTyped({ ...typed, from })}
              error={fault}
            />
          </View>
          <View style={styles.time}>
            <TimeField
              label="Until"
              value={typed.until}
              onChange={(until) => setTyped({ ...typed, until })}
            />
          </View>
          {isKept ? null : (
            <Button
              label="Keep these hours"
              kind="secondary"
              isBusy={change.isPending}
              isDisabled={fault !== undefined}
              onPress={() => keep({ ...typed, zone })}
            />
          )}
        </View>
      ) : null}
    </View>
  )
}

const styles = StyleSheet.create({
  frame: { gap: space.sm },
  times: { flexDirection: 'row', flexWrap: 'wrap', gap: space.md, alignItems: 'flex-end' },
  time: { width: 140 },
})
