import { StyleSheet, View } from 'react-native'

import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { ButtonLink } from '@/components/ui/button-link'
import { Card } from '@/components/ui/card'
import { Text } from '@/components/ui/text'
import { useToast } from '@/components/ui/toast'
import { space } from '@/constants/theme'
import { useChangeSelling } from '@/hooks/use-own-listings'
import type { OwnListing } from '@/shared/contracts/listings'

export function SellingActs({ own }: { own: OwnListing }) {
  const { listingId, may } = own
  const toast = useToast()
  const change = useChangeSelling(listingId)
  const set = (selling: 'paused' | 'live') =>
    change.mutate(selling, {
      onSuccess: () =>
        toast({
          tone: 'safe',
          text: selling === 'live' ? 'It is on sale again.' : 'Paused. Orders already made go on.',
        }),
    })
  return (
    <Card>
      {change.error ? (
        <Banner tone="danger" title="That did not work" isLive>
          {change.error.message}
        </Banner>
      ) : null}
      {may.includes('resume') ? (
        <Button
          label="Take it up again"
          isWide
          isBusy={change.isPending}
          busyLabel="Taking it up"
          onPress={() => set('live')}
        />
      ) : null}
      {may.includes('edit') ? (
        <View style={styles.act}>
          <ButtonLink
            kind={may.includes('resume') ? 'secondary' : 'primary'}
            icon="edit"
            isWide
            label="Change this batch"
            href={{ pathname: '/sell/listings/[listingId]', params: { listingId } }}
          />
          <Text size="small" tint="muted">
            Count, price, windows, water and terms go live at once. Words and photos are read first. Species,
            origin, hatch date, licences and health take it off sale until a moderator has looked.
          </Text>
        </View>
      ) : null}
      {may.includes('pause') ? (
        <View style={styles.act}>
          <Button
            kind="secondary"
            label="Pause"
            isWide
            isBusy={change.isPending}
            busyLabel="Pausing"
            onPress={() => set('paused')}
          />
          <Text size="small" tint="muted">
            Nobody can order until you take it up again. Orders already made go on.
          </Text>
        </View>
      ) : null}
      <ButtonLink
        kind="secondary"
        icon="orders"
        isWide
        label={own.openOrders === 0 ? 'Orders' : `Orders (${own.openOrders} open)`}
        href={{ pathname: '/orders', params: { as: 'seller' } }}
      />
      {own.state === 'live' || own.state === 'paused' || own.state === 'sold_out' ? (
        <ButtonLink
          kind="quiet"
          icon="eye"
          label="See it as buyers do"
          href={{ pathname: '/listings/[listingId]', params: { listingId } }}
        />
      ) : null}
    </Card>
  )
}

const styles = StyleSheet.create({ act: { gap: space.xs } })
