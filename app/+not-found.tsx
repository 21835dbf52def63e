import { Page } from '@/components/layout/page'
import { ButtonLink } from '@/components/ui/button-link'
import { EmptyState } from '@/components/ui/empty-state'

export default function NotFound() {
  return (
    <Page
      title="Nothing at this address"
      isHeadingHidden
      width="readable"
      back={{ label: 'Back to find', href: '/' }}
    >
      <EmptyState
        icon="question"
        title="Nothing hangs on this hook"
        body="The address may be mistyped, or the listing was taken down. What you saved and ordered is still in its place."
        action={<ButtonLink href="/" label="Find growers near you" />}
      />
    </Page>
  )
}
