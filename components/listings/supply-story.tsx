import { lazy } from 'react'

import { FactRows } from './fact-rows'

import { CautionList } from '@/components/rules/caution-list'
import { useUnits } from '@/hooks/use-units'

import type { SupplyBody } from '@/components/supplies/supply-body'

interface Props {
  body: SupplyBody
  count: number
}

/** Facts and cautions of worms, media and produce; what is known of them is fetched with it, no sooner. */
export const SupplyStory = lazy(async () => {
  const { supplyFacts, supplyCautions } = await import('@/components/forms/supplies/supplies-group')
  function Story({ body, count }: Props) {
    const units = useUnits()
    return (
      <>
        {supplyFacts(body, { units, count }).map(({ title, facts }) => (
          <FactRows key={title} title={title} facts={facts} />
        ))}
        <CautionList cautions={supplyCautions(body)} />
      </>
    )
  }
  return { default: Story }
})
