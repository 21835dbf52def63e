import { seasonSummary } from './season-words'

import { Text } from '@/components/ui/text'

import type { SeasonStripProps } from './season-strip'

/** On the phone app the words stand for the picture. */
export function SeasonStrip({ weeks, mondays }: SeasonStripProps) {
  return <Text>{seasonSummary(weeks, mondays)}</Text>
}
