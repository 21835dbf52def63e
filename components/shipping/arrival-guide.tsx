import { hoursInBag, openingSteps } from './shipment-words'

import { Banner } from '@/components/ui/banner'
import { Text } from '@/components/ui/text'
import type { ShownOrder } from '@/shared/contracts/orders'
import { fillCaution } from '@/shared/domain/rules/fill-caution'

const AFTER = ['handed_over', 'arrived', 'settled']

/** What the buyer does with the animals in the first hour, by the hours they spent in the bag. */
export function ArrivalGuide({ order }: { order: ShownOrder }) {
  const { shipment, party, state } = order
  const isComing = state === 'dispatched'
  if (party !== 'buyer' || !(isComing || AFTER.includes(state))) return null
  // Once all is well nobody opens the box again; what holds for weeks stays.
  const isSettled = state === 'settled'
  const isBedding = shipment?.check?.packing !== undefined && shipment.check.packing.bagsPerBox === undefined
  const steps = shipment && !isBedding && !isSettled ? openingSteps(hoursInBag(shipment)) : []
  return (
    <Banner
      tone="info"
      title={isComing ? 'When the box comes' : isSettled ? 'From now on' : 'Look after them now'}
    >
      {shipment && !isSettled ? (
        <Text>
          {isBedding
            ? 'Open the box at once, in the shade. Take a photo if anything is wrong.'
            : 'Open the box at once, in the shade. Take a photo of the shut bags beside the box: it is what a claim needs.'}
        </Text>
      ) : null}
      {steps.map((step) => (
        <Text key={step}>{step}</Text>
      ))}
      {isBedding ? null : (
        <>
          {steps.length > 0 || isSettled ? null : <Text>{fillCaution('G-8', { hours: '6' })}</Text>}
          <Text>{fillCaution('G-7', {})}</Text>
        </>
      )}
      <Text>{fillCaution('G-1', {})}</Text>
    </Banner>
  )
}
