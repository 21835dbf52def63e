import { useState } from 'react'

import { Fact } from '@/components/orders/fact'
import { Button } from '@/components/ui/button'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import type { MovementFacts } from '@/shared/contracts/shipments'
import { printLongDay, printMoment } from '@/shared/times/print-time'

const paperDay = (day: string) => printLongDay(`${day}T12:00:00Z`, 'UTC')

/** What the paper that travels with the animals says, to be shown when somebody asks. */
export function MovementCard({ movement, zone }: { movement: MovementFacts; zone: string }) {
  const [isOpen, setIsOpen] = useState(false)
  const { seller, buyer, permits } = movement
  return (
    <Card labelledBy="movement">
      <Heading level={2} size="lead" nativeID="movement">
        The paper that travels with them
      </Heading>
      <Fact name="Number">{movement.number}</Fact>
      <Fact name="Animals">{`${movement.count} ${movement.commonName} (${movement.scientificName}), ${movement.size}`}</Fact>
      {isOpen ? (
        <>
          <Fact name="Sent">{printMoment(movement.at, zone)}</Fact>
          <Fact name="From">{`${seller.name}, ${seller.address}`}</Fact>
          <Fact name="Licences">{seller.licences}</Fact>
          <Fact name="To">{`${buyer.name}, ${buyer.address}`}</Fact>
          <Fact name="Batch">{`${movement.batch}, in ${movement.boxes} ${movement.boxes === 1 ? 'box' : 'boxes'}`}</Fact>
          <Fact name="Carrier">{`${movement.carrier}, ${movement.tracking}`}</Fact>
          {permits.map((permit) => (
            <Fact key={permit.number} name="Permit">
              {`${permit.kind}: ${permit.number}, by ${permit.issuer}, ${paperDay(permit.issuedOn)} to ${paperDay(permit.expiresOn)}`}
            </Fact>
          ))}
          <Fact name="Note">{movement.notForRelease}</Fact>
        </>
      ) : null}
      <Button
        kind="quiet"
        icon={isOpen ? 'up' : 'down'}
        label={isOpen ? 'Show less' : 'Show all of it'}
        isExpanded={isOpen}
        onPress={() => setIsOpen(!isOpen)}
      />
    </Card>
  )
}
