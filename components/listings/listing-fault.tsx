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

export function ListingFault({ error, onRetry, isRetrying }: Props) {
  if (error instanceof Problem && gone.includes(error.slug)) {
    return (
      <EmptyState
        icon="question"
        title="This listing is not here"
        body="It may have ended or been taken down, or the address is mistyped."
        action={<ButtonLink href="/" label="Find others near you" />}
      />
    )
  }
  return (
    <ErrorState
      title="We could not load this listing"
      body={`${error.message.replace(/\.?$/, '.')} Nothing is lost.`}
      onRetry={onRetry}
      isRetrying={isRetrying}
    />
  )
}
