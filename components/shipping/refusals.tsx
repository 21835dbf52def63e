import { nearestDayWords } from './dispatch-words'

import { Banner } from '@/components/ui/banner'
import { Text } from '@/components/ui/text'
import { Problem } from '@/shared/api/problem'

/** Everything that speaks against an act, all at once, and the nearest day on which it may be done. */
export function Refusals({ error, title }: { error: Error | null; title: string }) {
  if (!error) return null
  const told = error instanceof Problem ? (error.errors ?? []).map(({ detail }) => detail) : []
  const nearest = error instanceof Problem ? nearestDayWords(error.facts) : null
  const reasons = [...new Set(told)]
  return (
    <Banner tone="danger" title={title} isLive>
      {reasons.length === 0 ? <Text>{error.message}</Text> : null}
      {reasons.map((reason) => (
        <Text key={reason}>{reasons.length > 1 ? `• ${reason}` : reason}</Text>
      ))}
      {nearest ? <Text face="strong">{nearest}</Text> : null}
    </Banner>
  )
}
