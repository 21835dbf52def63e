import { expect, it } from 'vitest'

import { blankAddress, shipAddressErrors, trimmedAddress } from '@/components/reservations/ship-address'
import { shipAddress, type ShipAddress } from '@/shared/contracts/shipments'

const good: ShipAddress = {
  name: 'June Park',
  street: '1 Mill Road',
  city: 'Dayton',
  state: 'OH',
  zip: '45402',
  phone: '(937) 555-0100',
}
const changes: Partial<ShipAddress>[] = [
  {},
  { name: 'J' },
  { name: ' Jo ' },
  { name: 'x'.repeat(81) },
  { street: '1' },
  { street: 'x'.repeat(121) },
  { city: 'D' },
  { state: '' },
  { state: 'oh' },
  { zip: '4540' },
  { zip: '45402-1234' },
  { phone: '555' },
  { phone: 'call me maybe' },
  { phone: '+1 937 555 0100' },
  blankAddress('', ''),
]

it('asks of an address what the wire asks, field by field, without carrying the contract into the first load', () => {
  for (const change of changes) {
    const address = { ...good, ...change }
    const read = shipAddress.safeParse(trimmedAddress(address))
    const onWire = new Set((read.error?.issues ?? []).map((issue) => `ship-${String(issue.path[0])}`))
    const here = new Set(shipAddressErrors(address).map(({ fieldId }) => fieldId))
    expect(here, JSON.stringify(change)).toEqual(onWire)
  }
})
