import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'

import { Page } from '@/components/layout/page'
import { kindNamed, kindTitles } from '@/components/selling/kind-of'
import { LazyPart } from '@/components/ui/lazy-part'

const BeginBatch = lazy(() =>
  import('@/components/selling/selling-group').then((group) => ({ default: group.BeginBatch })),
)
const KindChoice = lazy(() =>
  import('@/components/selling/selling-group').then((group) => ({ default: group.KindChoice })),
)

export default function NewListingPage() {
  const kind = kindNamed(useLocalSearchParams<{ kind?: string }>().kind)
  return (
    <Page
      title={kind ? kindTitles[kind] : 'List something'}
      width="readable"
      back={{ label: 'Back to selling', href: '/sell' }}
    >
      <LazyPart label="Loading your earlier listings">
        {kind ? <BeginBatch kind={kind} /> : <KindChoice />}
      </LazyPart>
    </Page>
  )
}
