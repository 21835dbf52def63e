import { findTool } from './tool-list'
import { ToolPage } from './tool-page'

import { Page } from '@/components/layout/page'
import { ButtonLink } from '@/components/ui/button-link'
import { EmptyState } from '@/components/ui/empty-state'

/** One calculator by the name in its address. */
export function ToolScreen({ toolId }: { toolId: string }) {
  const tool = findTool(toolId)
  return (
    <Page
      title={tool?.title ?? 'No such calculator'}
      back={{ label: 'Back to the calculators', href: '/tools' }}
    >
      {tool ? (
        <ToolPage key={tool.id} tool={tool} />
      ) : (
        <EmptyState
          title="There is no calculator of that name"
          body="It may have got another address."
          action={<ButtonLink label="All calculators" href="/tools" />}
        />
      )}
    </Page>
  )
}
