import { useLocalSearchParams } from 'expo-router'
import { lazy } from 'react'

import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'
import { SkeletonRows } from '@/components/ui/skeleton'

const ToolScreen = lazy(() =>
  import('@/components/tools/tools-group').then((group) => ({ default: group.ToolScreen })),
)

export default function ToolRoute() {
  const { toolId } = useLocalSearchParams<{ toolId: string }>()
  return (
    <LazyPart label="Loading the calculator" fallback={<Loading />}>
      <ToolScreen toolId={toolId} />
    </LazyPart>
  )
}

function Loading() {
  return (
    <Page title="Calculator" back={{ label: 'Back to the calculators', href: '/tools' }}>
      <SkeletonRows label="Loading the calculator" rows={4} />
    </Page>
  )
}
