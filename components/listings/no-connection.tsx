import { ErrorState } from '@/components/ui/error-state'

interface Props {
  /** What is kept: "Your filters are kept." */
  kept: string
  onRetry: () => void
}

/** The device says it is offline: what was asked goes on by itself once it is back. */
export function NoConnection({ kept, onRetry }: Props) {
  return (
    <ErrorState
      title="No connection"
      body={`${kept} It goes on by itself as soon as there is a signal.`}
      onRetry={onRetry}
    />
  )
}
