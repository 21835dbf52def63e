import { useState } from 'react'
import { StyleSheet, View } from 'react-native'

import { Badge } from '@/components/ui/badge'
import { Button } from '@/components/ui/button'
import { Card } from '@/components/ui/card'
import { Confirm } from '@/components/ui/confirm'
import { ErrorState } from '@/components/ui/error-state'
import { Heading } from '@/components/ui/heading'
import { SkeletonRows } from '@/components/ui/skeleton'
import { Text } from '@/components/ui/text'
import { useToast } from '@/components/ui/toast'
import { color, space } from '@/constants/theme'
import { useEndSession, useSessions } from '@/hooks/use-sessions'
import type { ShownSession } from '@/shared/contracts/sessions'

const HERE = Intl.DateTimeFormat().resolvedOptions().timeZone
const moment = new Intl.DateTimeFormat('en-US', {
  ...{ month: 'short', day: 'numeric', hour: 'numeric', timeZone: HERE },
})

/** Where one is signed in, and the way to end it. */
export function SessionsCard() {
  return (
    <Card labelledBy="account-sessions">
      <Heading level={2} size="lead" nativeID="account-sessions">
        Where you are signed in
      </Heading>
      <Rows />
    </Card>
  )
}

function Rows() {
  const { data, error, refetch, isRefetching } = useSessions()
  const end = useEndSession()
  const toast = useToast()
  const [isAsking, setAsking] = useState(false)
  if (!data) {
    if (!error) return <SkeletonRows label="Loading your sign-ins" rows={2} />
    return (
      <ErrorState
        level={3}
        title="We could not load your sign-ins"
        body="Nothing has changed. Try again in a moment."
        onRetry={() => void refetch()}
        isRetrying={isRefetching}
      />
    )
  }
  const stop = (sessionId: string | undefined) =>
    end.mutate(sessionId, {
      onSuccess: () => toast({ text: 'Signed out there.', tone: 'safe' }),
      onError: ({ message }) => toast({ text: message, tone: 'danger' }),
      onSettled: () => setAsking(false),
    })
  const others = data.items.filter((one) => !one.isThis)
  return (
    <>
      <View role="list">
        {data.items.map((one) => (
          <Row
            key={one.sessionId}
            session={one}
            isBusy={end.isPending && end.variables === one.sessionId}
            onEnd={() => stop(one.sessionId)}
          />
        ))}
      </View>
      {others.length === 0 ? (
        <Text tint="muted">Nowhere else.</Text>
      ) : (
        <Button kind="secondary" label="Sign out everywhere else" onPress={() => setAsking(true)} />
      )}
      <Confirm
        title="Sign out everywhere else?"
        isOpen={isAsking}
        actLabel="Sign out the others"
        keepLabel="Keep them"
        isBusy={end.isPending}
        busyLabel="Signing out"
        onAct={() => stop(undefined)}
        onClose={() => setAsking(false)}
      >
        {others.length === 1
          ? 'The other device has to sign in again. This one stays.'
          : `The ${others.length} other devices have to sign in again. This one stays.`}
      </Confirm>
    </>
  )
}

interface RowProps {
  session: ShownSession
  isBusy: boolean
  onEnd: () => void
}

function Row({ session, isBusy, onEnd }: RowProps) {
  const { device, startedAt, lastUsedAt, isThis } = session
  return (
    <View role="listitem" style={styles.row}>
      <View style={styles.words}>
        <Text face="strong">{device}</Text>
        <Text size="note" tint="muted">
          {`Signed in ${moment.format(new Date(startedAt))}, last used about ${moment.format(new Date(lastUsedAt))}`}
        </Text>
      </View>
      {isThis ? (
        <Badge word="This one" tone="safe" icon="check" />
      ) : (
        <Button
          kind="quiet"
          label="Sign out"
          spokenLabel={`Sign out ${device}, signed in ${moment.format(new Date(startedAt))}`}
          busyLabel="Signing out"
          isBusy={isBusy}
          onPress={onEnd}
        />
      )}
    </View>
  )
}

const styles = StyleSheet.create({
  row: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    gap: space.md,
    paddingVertical: space.sm,
    borderTopWidth: 1,
    borderTopColor: color.line,
  },
  words: { flexGrow: 1, flexShrink: 1, flexBasis: 220 },
})
