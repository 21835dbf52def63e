import { NumberField } from '@/components/ui/number-field'
import { RadioGroup } from '@/components/ui/radio-group'
import { Select } from '@/components/ui/select'
import { useUnits } from '@/hooks/use-units'
import type { ShownListing } from '@/shared/contracts/listings'
import { driveHoursFor, type Ride } from '@/shared/domain/transport/drive-home'
import { aerations, homeContainers } from '@/shared/domain/transport/home-containers.facts'
import type { Vessel } from '@/shared/domain/transport/trip'
import { printSlot } from '@/shared/times/print-time'
import { aboutDistance } from '@/shared/units/distance'
import { readNumber } from '@/shared/units/read-number'

/** What was chosen so far; a field not yet touched shows what is usual. */
export interface Typed {
  windowId?: string
  containerId?: string
  aeration?: Vessel['aeration']
  ride?: Ride
  hours?: string
  parked?: string
}

const rides: readonly { value: Ride; label: string; hint?: string }[] = [
  { value: 'cabin', label: 'In the car with you' },
  { value: 'van', label: 'In a closed truck bed or van' },
  { value: 'outdoor', label: 'On an open truck bed' },
]
const stops = [
  { value: '0', label: 'No stop' },
  { value: '15', label: '15 minutes, car closed' },
  { value: '30', label: '30 minutes, car closed' },
  { value: '60', label: 'An hour, car closed' },
]

/** Hours as typed, or as reckoned from the distance. null: not readable. */
export function hoursOf(typed: Typed, distanceKm: number): number | null {
  return typed.hours === undefined ? driveHoursFor(distanceKm) : readNumber(typed.hours)
}

interface Props {
  listing: ShownListing
  distanceKm: number
  typed: Typed
  onTyped: (typed: Typed) => void
}

export function DriveFields({ listing, distanceKm, typed, onTyped }: Props) {
  const units = useUnits()
  const put = (change: Typed) => onTyped({ ...typed, ...change })
  const hours = hoursOf(typed, distanceKm)
  return (
    <>
      {listing.windows.length > 1 ? (
        <Select
          label="Pickup"
          value={typed.windowId ?? listing.windows[0]?.windowId ?? ''}
          choices={listing.windows.map((window) => ({ value: window.windowId, label: printSlot(window) }))}
          onChange={(windowId) => put({ windowId })}
        />
      ) : null}
      <Select
        label="What they travel in"
        value={typed.containerId ?? homeContainers[0]?.id ?? ''}
        choices={homeContainers.map(({ id, label, hint }) => ({ value: id, label: `${label}: ${hint}` }))}
        onChange={(containerId) => put({ containerId })}
      />
      <RadioGroup
        label="Air on the way"
        value={typed.aeration ?? 'none'}
        choices={aerations}
        onChange={(aeration) => put({ aeration })}
      />
      <RadioGroup
        label="Where it stands"
        value={typed.ride ?? 'cabin'}
        choices={rides}
        onChange={(ride) => put({ ride })}
      />
      <NumberField
        label="Hours on the way"
        hint={`It is ${aboutDistance(distanceKm, units)} as the crow flies; we reckon a quarter more, at 45 mph.`}
        suffix="h"
        value={typed.hours ?? String(hours)}
        onChangeText={(text) => put({ hours: text })}
        error={hours === null ? 'A figure, like 0.75.' : undefined}
      />
      <Select
        label="Stop on the way"
        value={typed.parked ?? '0'}
        choices={stops}
        onChange={(parked) => put({ parked })}
      />
    </>
  )
}
