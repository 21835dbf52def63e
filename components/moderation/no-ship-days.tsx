import { useState } from 'react'
import { StyleSheet, View } from 'react-native'

import { AddNoShipDay } from './add-no-ship-day'
import { DeskFault } from './desk-fault'
import { noShipDayWords } from './no-ship-day-words'

import { Banner } from '@/components/ui/banner'
import { Badge } from '@/components/ui/badge'
import { Button } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/empty-state'
import { SkeletonRows } from '@/components/ui/skeleton'
import { Text } from '@/components/ui/text'
import { color, space } from '@/constants/theme'
import { useKeepNoShipDay, useNoShipDays } from '@/hooks/use-no-ship-days'
import type { ShownNoShipDay } from '@/shared/contracts/no-ship-days'

/** Days without carriers: federal holidays and days of our own. Nothing leaves, travels or arrives on them. */
export function NoShipDays() {
  const query = useNoShipDays()
  const keep = useKeepNoShipDay()
  const [changing, setChanging] = useState('')
  if (query.isPending) return <SkeletonRows label="Loading the days" rows={4} />
  if (!query.data) {
    return (
      <DeskFault error={query.error} onRetry={() => void query.refetch()} isRetrying={query.isFetching} />
    )
  }
  const { days } = query.data
  const turn = ({ day, why, isOff }: ShownNoShipDay) => {
    setChanging(day)
    keep.mutate({ day, why, isOff: !isOff })
  }
  return (
    <View style={styles.frame}>
      <AddNoShipDay taken={days} />
      {keep.error ? (
        <Banner tone="danger" title="The list stays as it was" isLive>
          {keep.error.message}
        </Banner>
      ) : null}
      {days.length === 0 ? (
        <EmptyState
          icon="calendar"
          title="No day is on the list"
          body="Carriers then work on every ship day. Add the next day on which they do not."
        />
      ) : (
        <View role="list" aria-label="Days without carriers" style={styles.list}>
          {days.map((one) => (
            <View key={one.day} role="listitem" style={styles.row}>
              <View style={styles.words}>
                <Text face="strong" tint={one.isOff ? 'muted' : 'ink'}>
                  {noShipDayWords(one.day)}
                </Text>
                <Text size="note">{one.why}</Text>
                <Badge
                  word={
                    one.isOff
                      ? 'Taken off: carriers work'
                      : one.source === 'federal'
                        ? 'Federal holiday'
                        : 'Our own day'
                  }
                  tone={one.isOff ? 'caution' : 'neutral'}
                  icon={one.isOff ? 'truck' : 'calendar'}
                />
              </View>
              <Button
                kind="secondary"
                label={one.isOff ? 'Put it back' : 'Take it off'}
                spokenLabel={`${one.isOff ? 'Put it back' : 'Take it off'}: ${noShipDayWords(one.day)}`}
                isBusy={keep.isPending && changing === one.day}
                busyLabel="Keeping"
                onPress={() => turn(one)}
              />
            </View>
          ))}
        </View>
      )}
    </View>
  )
}

const styles = StyleSheet.create({
  frame: { gap: space.xl },
  list: { backgroundColor: color.card },
  row: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    gap: space.md,
    padding: space.lg,
    borderTopWidth: 1,
    borderTopColor: color.line,
  },
  words: { flexGrow: 1, flexShrink: 1, flexBasis: 200, minWidth: 0, gap: 2 },
})
