import { FactRows } from './fact-rows'

import type { FishBody } from '@/shared/contracts/fish-batch'

export function ArrivalPromise({ promise }: Pick<FishBody, 'promise'>) {
  const remedy =
    promise.remedy === 'refund'
      ? 'Every animal short of the number you paid for is refunded at the price you paid.'
      : 'Every animal short of the number you paid for is replaced, or refunded if you both prefer.'
  return (
    <FactRows
      title="Arrival promise"
      facts={[
        { term: 'Alive', value: `For ${promise.windowHours} hours after hand-over. ${remedy}` },
        {
          term: 'Later',
          value:
            promise.survivalDays === 0
              ? 'Deaths in the days after are not covered.'
              : `Alive for ${promise.survivalDays} days too, kept as the care notes say.`,
        },
        { term: 'What to show', value: promise.evidence },
      ]}
    />
  )
}
