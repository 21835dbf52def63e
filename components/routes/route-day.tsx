import { useState } from 'react'
import { StyleSheet, View } from 'react-native'

import type { RouteDay as Day } from './group-routes'
import { RouteCard } from './route-card'
import { checkedWords, dayTotals, openRows } from './route-words'
import { RoutesTable } from './routes-table'

import { ActFailed } from '@/components/orders/act-failed'
import { dayWords } from '@/components/shipping/ship-day-words'
import { Button } from '@/components/ui/button'
import { Confirm } from '@/components/ui/confirm'
import { Heading } from '@/components/ui/heading'
import { Text } from '@/components/ui/text'
import { useToast } from '@/components/ui/toast'
import { space } from '@/constants/theme'
import { useBreakpoint } from '@/hooks/use-breakpoint'
import { useCheckRoutes } from '@/hooks/use-routes'

/** Everything that leaves on one day, and the two acts for all of it at once. */
export function RouteDay({ day: { shipDay, rows } }: { day: Day }) {
  const isWide = useBreakpoint() === 'wide'
  const [isAsking, setAsking] = useState(false)
  const check = useCheckRoutes()
  const say = useToast()
  const words = dayWords(shipDay)
  const look = (hold: boolean) =>
    check.mutate(
      { shipDay, hold },
      {
        onSuccess: ({ rows: all, held }) =>
          say({
            text: `${words}: ${checkedWords({ rows: all.filter((row) => row.shipDay === shipDay), held })}`,
          }),
        onSettled: () => setAsking(false),
      },
    )
  const running = check.isPending ? check.variables.hold : null
  return (
    <View role="region" aria-label={`Leaves ${words}`} style={styles.day}>
      <View style={styles.head}>
        <Heading level={2} size="lead">{`Leaves ${words}`}</Heading>
        <Text size="note" tint="muted">
          {dayTotals(rows)}
        </Text>
      </View>
      {openRows(rows).length === 0 ? null : (
        <View style={styles.acts}>
          <Button
            kind="secondary"
            icon="thermometer"
            label="Look at all ways again"
            spokenLabel={`Look at all ways again: ${words}`}
            isBusy={running === false}
            busyLabel="Looking at the weather"
            onPress={() => look(false)}
          />
          <Button
            kind="quiet"
            label="Look again and hold what is not safe"
            spokenLabel={`Look again and hold what is not safe: ${words}`}
            onPress={() => setAsking(true)}
          />
        </View>
      )}
      <ActFailed error={check.error} />
      {isWide ? (
        <RoutesTable label={`Orders that leave ${words}`} rows={rows} />
      ) : (
        <View role="list" aria-label={`Orders that leave ${words}`} style={styles.list}>
          {rows.map((row) => (
            <View key={row.orderId} role="listitem">
              <RouteCard row={row} />
            </View>
          ))}
        </View>
      )}
      <Confirm
        title={`Hold what is not safe on ${words}?`}
        isOpen={isAsking}
        actLabel="Look again and hold them"
        keepLabel="Hold nothing"
        isBusy={running === true}
        busyLabel="Looking and holding"
        onAct={() => look(true)}
        onClose={() => setAsking(false)}
      >
        Every way of this day is looked at anew. Where the animals would not arrive well, the order is held,
        the next safe day is proposed, and the buyer is told at once. They may agree, choose another day, or
        get every cent back.
      </Confirm>
    </View>
  )
}

const styles = StyleSheet.create({
  day: { gap: space.md },
  head: { gap: 2 },
  acts: { flexDirection: 'row', flexWrap: 'wrap', gap: space.sm },
  list: { gap: space.md },
})
