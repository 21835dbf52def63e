import { Text } from '@/components/ui/text'

import type { TripLineProps } from './trip-line'

/** On the phone app the words stand for the picture; the table beside it has every hour. */
export function TripLine({ label }: TripLineProps) {
  return <Text>{label}</Text>
}
