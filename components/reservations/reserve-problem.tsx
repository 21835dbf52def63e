import { Banner } from '@/components/ui/banner'
import { Link } from '@/components/ui/link'
import { Text } from '@/components/ui/text'
import { Problem } from '@/shared/api/problem'

interface Props {
  error: Error | null
  listingId: string
}

const titles: Partial<Record<string, string>> = {
  'batch-short': 'Just taken',
  'slot-full': 'That pickup time is full',
  'version-stale': 'The listing has changed',
  'holds-too-many': 'You hold enough for now',
  'payments-away': 'The payment service does not answer',
}

/** Why the hold did not work, and what to do instead. */
export function ReserveProblem({ error, listingId }: Props) {
  if (!error) return null
  const slug = error instanceof Problem ? error.slug : ''
  const fields = error instanceof Problem ? (error.errors ?? []) : []
  return (
    <Banner tone="danger" title={titles[slug] ?? 'Not held'} isLive>
      <Text>{error.message}</Text>
      {fields.map((field) => (
        <Text key={field.pointer}>{field.detail}</Text>
      ))}
      {slug === 'version-stale' || slug === 'listing-closed' ? (
        <Link href={`/listings/${listingId}`}>Look at the listing again</Link>
      ) : null}
      {slug === 'batch-short' ? <Link href="/">Look for others nearby</Link> : null}
      {slug === 'holds-too-many' ? <Link href="/orders">See your holds</Link> : null}
    </Banner>
  )
}
