import { useRouter } from 'expo-router'
import { lazy } from 'react'

import { StartSelling } from './start-selling'

import { ErrorState } from '@/components/ui/error-state'
import { LazyPart } from '@/components/ui/lazy-part'
import { SkeletonRows } from '@/components/ui/skeleton'
import { useToast } from '@/components/ui/toast'
import { useMe } from '@/hooks/use-me'
import { useOwnFarm } from '@/hooks/use-own-farm'
import type { OwnSeller } from '@/shared/contracts/sellers'

const FarmForm = lazy(() =>
  import('@/components/forms/forms-group').then((group) => ({ default: group.FarmForm })),
)

/** Opens a farm or changes it; the way then leads to the payouts until those are ready. */
export function FarmScreen() {
  const router = useRouter()
  const toast = useToast()
  const { me, isPending } = useMe()
  const isSeller = Boolean(me?.sellerId)
  const farm = useOwnFarm(isSeller)
  function saved({ payouts }: OwnSeller) {
    toast({ tone: 'safe', text: 'Your farm is saved.' })
    router.replace(payouts === 'ready' ? '/sell' : '/sell/payouts')
  }
  if (isPending || (isSeller && farm.isPending)) return <SkeletonRows label="Loading your farm" />
  if (!me) return <StartSelling me={null} />
  if (isSeller && !farm.data) {
    return (
      <ErrorState
        title="We could not load your farm"
        body={farm.error?.message ?? 'Nothing is lost.'}
        onRetry={() => void farm.refetch()}
        isRetrying={farm.isRefetching}
      />
    )
  }
  return (
    <LazyPart label="Loading the form">
      <FarmForm farm={farm.data ?? null} onSaved={saved} />
    </LazyPart>
  )
}
