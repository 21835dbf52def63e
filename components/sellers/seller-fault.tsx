import { ButtonLink } from '@/components/ui/button-link'
import { EmptyState } from '@/components/ui/empty-state'
import { ErrorState } from '@/components/ui/error-state'
import { Problem } from '@/shared/api/problem'

interface Props {
  error: Error
  onRetry: () => void
  isRetrying: boolean
}

const gone = ['not-found', 'no-such-path', 'fields-invalid']

export function SellerFault({ error, onRetry, isRetrying }: Props) {
  if (error instanceof Problem && gone.includes(error.slug)) {
    return (
      <EmptyState
        icon="question"
        title="No grower at this address"
        body="They may have closed their page, or the address is mistyped."
        action={<ButtonLink href="/" label="Find growers near you" />}
      />
    )
  }
  return (
    <ErrorState
      title="We could not load this page"
      body={`${error.message.replace(/\.?$/, '.')} Nothing is lost.`}
      onRetry={onRetry}
      isRetrying={isRetrying}
    />
  )
}
