import { Banner } from '@/components/ui/banner'
import { Text } from '@/components/ui/text'

/** Why an act was refused, in the server's own sentence. */
export function ActFailed({ error }: { error: Error | null }) {
  if (!error) return null
  return (
    <Banner tone="danger" title="That did not work" isLive>
      <Text>{error.message}</Text>
    </Banner>
  )
}
