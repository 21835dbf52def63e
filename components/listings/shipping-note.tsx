import { notYetSold } from './shipping-words'

import { Text } from '@/components/ui/text'
import type { ShippedTo } from '@/shared/contracts/shipping'

/** Beside tags of which one speaks of shipping: nobody should look for a button that is not there. */
export function ShippingNote({ listings }: { listings: readonly { shipped?: ShippedTo | undefined }[] }) {
  if (!listings.some(({ shipped }) => shipped)) return null
  return (
    <Text tint="muted" size="note">
      {notYetSold}
    </Text>
  )
}
