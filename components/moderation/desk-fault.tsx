import { ButtonLink } from '@/components/ui/button-link'
import { EmptyState } from '@/components/ui/empty-state'
import { ErrorState } from '@/components/ui/error-state'
import { Problem } from '@/shared/api/problem'

interface Props {
  error: Error
  onRetry: () => void
  isRetrying: boolean
}

/** Why the desk does not open, each with the way on. */
export function DeskFault({ error, onRetry, isRetrying }: Props) {
  const slug = error instanceof Problem ? error.slug : undefined
  if (slug === 'second-factor-needed') {
    return (
      <EmptyState
        icon="lock"
        title="Set up a second factor first"
        body="Whoever decides about other people’s listings signs in with a code as well. It takes two minutes."
        action={<ButtonLink href="/me/second-factor" label="Set it up" />}
      />
    )
  }
  if (slug === 'not-signed-in') {
    return (
      <EmptyState
        icon="lock"
        title="Sign in to moderate"
        body="This desk is for moderators."
        action={
          <ButtonLink href={{ pathname: '/sign-in', params: { returnTo: '/moderate' } }} label="Sign in" />
        }
      />
    )
  }
  if (slug === 'not-allowed') {
    return (
      <EmptyState
        icon="shield"
        title="This desk is for moderators"
        body="Your account can buy and sell. To report a listing, open it and say what is wrong."
        action={<ButtonLink href="/" label="Find growers near you" />}
      />
    )
  }
  if (slug === 'not-found') {
    return (
      <EmptyState
        icon="question"
        title="No such version"
        body="It may have been thrown away by its seller."
        action={<ButtonLink href="/moderate" label="To the queue" />}
      />
    )
  }
  return (
    <ErrorState
      title="The desk did not load"
      body={error.message}
      onRetry={onRetry}
      isRetrying={isRetrying}
    />
  )
}
