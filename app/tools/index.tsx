import { lazy } from 'react'

import { Page } from '@/components/layout/page'
import { LazyPart } from '@/components/ui/lazy-part'

const ToolsHome = lazy(() =>
  import('@/components/tools/tools-group').then((group) => ({ default: group.ToolsHome })),
)

export default function ToolsIndex() {
  return (
    <Page
      title="Calculators"
      intro="For water, fish and the way home. Each says its equation, where it holds, and who published it."
      width="readable"
      back={{ label: 'Back to find', href: '/' }}
    >
      <LazyPart label="Loading the calculators">
        <ToolsHome />
      </LazyPart>
    </Page>
  )
}
