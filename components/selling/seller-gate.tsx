import { Fragment, type ComponentType, type ReactNode } from 'react'

import { StartSelling } from './start-selling'

import { ErrorState } from '@/components/ui/error-state'
import { SkeletonRows } from '@/components/ui/skeleton'
import { useMe } from '@/hooks/use-me'
import { useOwnFarm } from '@/hooks/use-own-farm'
import type { Me } from '@/shared/contracts/members'
import type { OwnSeller } from '@/shared/contracts/sellers'

interface Props {
  children: (farm: OwnSeller, me: Me) => ReactNode
  /** The page around everything but the children, where those bring their own. */
  frame?: ComponentType<{ children: ReactNode }>
}

/** Lets sellers in with their farm; everybody else reads what selling here means. */
export function SellerGate({ children, frame: Frame = Fragment }: Props) {
  const { me, isPending, error, refetch } = useMe()
  const isSeller = Boolean(me?.sellerId)
  const farm = useOwnFarm(isSeller)
  if (me && farm.data) return children(farm.data, me)
  return (
    <Frame>
      {isPending || (isSeller && farm.isPending) ? (
        <SkeletonRows label="Loading your farm" />
      ) : error || me === undefined ? (
        <Fault error={error} onRetry={() => void refetch()} />
      ) : !me || !isSeller ? (
        <StartSelling me={me} />
      ) : (
        <Fault error={farm.error} onRetry={() => void farm.refetch()} isRetrying={farm.isRefetching} />
      )}
    </Frame>
  )
}

function Fault({ error, ...retry }: { error: Error | null; onRetry: () => void; isRetrying?: boolean }) {
  return (
    <ErrorState
      title="We could not load your farm"
      body={error?.message ?? 'Nothing is lost. Try again in a moment.'}
      {...retry}
    />
  )
}
