import { useRouter } from 'expo-router'

import { kindOf } from './kind-of'
import { useBegin } from './use-begin'

import { Button } from '@/components/ui/button'
import { useToast } from '@/components/ui/toast'
import type { OwnListing } from '@/shared/contracts/listings'
import type { OwnSeller } from '@/shared/contracts/sellers'

interface Props {
  own: OwnListing
  farm: OwnSeller
}

/** One tap to the next one like this: greens with today's harvest and a lot code of their own. */
export function AgainAct({ own, farm }: Props) {
  const router = useRouter()
  const toast = useToast()
  const begin = useBegin(farm)
  const kind = kindOf(own)
  if (own.liveVersion === undefined || own.state === 'taken_down') return null
  const label = kind === 'produce' ? 'Again, harvested today' : 'List another like it'
  return (
    <Button
      kind="quiet"
      icon="plus"
      label={label}
      spokenLabel={`${label}: ${own.title}`}
      isBusy={begin.isPending}
      busyLabel="Beginning"
      onPress={() =>
        begin.mutate(
          { kind, copyOf: own, last: undefined },
          {
            onSuccess: ({ listingId }) =>
              router.push({ pathname: '/sell/listings/[listingId]', params: { listingId } }),
            onError: (error) => toast({ tone: 'danger', text: error.message }),
          },
        )
      }
    />
  )
}
