import { useState } from 'react'

import { animalsOf, driveOf } from './drive-of'
import { hoursOf, type Typed } from './drive-fields'
import { TripLine } from './trip-line'
import { TripTable } from './trip-table'
import { TripVerdict } from './trip-verdict'

import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Text } from '@/components/ui/text'
import { useUnits } from '@/hooks/use-units'
import type { ShownListing, ShownWindow } from '@/shared/contracts/listings'
import type { WayHome } from '@/shared/contracts/trips'
import { checkDriveHome, type DriveHome } from '@/shared/domain/transport/drive-home'
import { homeContainers } from '@/shared/domain/transport/home-containers.facts'
import { travelRangeC } from '@/shared/domain/transport/judge-warmth'
import type { TripAnswer, TripSide } from '@/shared/domain/transport/trip'
import { hourOfDay } from '@/shared/times/hour-of-day'
import { printBothTemperatures } from '@/shared/units/temperature'

interface Props {
  listing: ShownListing
  count: number
  way: WayHome
  typed: Typed
  window: ShownWindow | undefined
}

const NOON = 12

/** The answer while one chooses: verdict, reasons, the line and its table. */
export function DriveAnswer({ listing, count, way, typed, window }: Props) {
  const driveHours = hoursOf(typed, way.distanceKm)
  if (driveHours === null) return null
  const drive = driveOf(listing, {
    ...{ count, way },
    choice: {
      containerId: typed.containerId ?? homeContainers[0]?.id ?? '',
      aeration: typed.aeration ?? 'none',
      ride: typed.ride ?? 'cabin',
      driveHours,
      parkedMinutes: Number(typed.parked ?? 0),
      departHour: window ? hourOfDay(window.endsAt, window.zone) : NOON,
    },
  })
  const answer = drive && checkDriveHome(drive)
  if (!drive || !answer) {
    return (
      <Banner tone="info" title="We cannot say">
        {animalsOf(listing, count)
          ? 'There is no weather station near enough to reckon by.'
          : 'Nobody published what these animals use on the way. Ask the grower how they take them.'}
      </Banner>
    )
  }
  return <Answered drive={drive} answer={answer} />
}

/** The side that comes nearer to its limit: the one with a reason against it, else the cold one. */
function worseSide({ cold, hot }: TripAnswer): TripSide | null {
  const counts = (side: TripSide | null) =>
    side?.reasons.filter(({ verdict }) => verdict !== 'safe').length ?? 0
  return counts(hot) > counts(cold) ? hot : cold
}

function Answered({ drive, answer }: { drive: DriveHome; answer: TripAnswer }) {
  const units = useUnits()
  const [isTable, setIsTable] = useState(false)
  const side = worseSide(answer)
  const vessel = { kind: 'vessel' as const, ...drive.container, aeration: drive.aeration }
  const rangeC = travelRangeC(drive.animals, vessel, answer.hours)
  const isHot = side === answer.hot && side !== answer.cold
  const extreme = isHot ? side?.warmest : side?.coldest
  const words = extreme
    ? `On the ${isHot ? 'hottest' : 'coldest'} day of ten the water ${isHot ? 'rises to' : 'falls to'} ${printBothTemperatures(extreme.waterC, units)}.`
    : ''
  return (
    <>
      <TripVerdict answer={answer} />
      {side && rangeC ? (
        <>
          <Text size="note">
            {`${words} They should travel between ${printBothTemperatures(rangeC[0], units)} and ${printBothTemperatures(rangeC[1], units)}.`}
          </Text>
          <TripLine
            steps={side.steps}
            rangeC={rangeC}
            departHour={drive.departHour}
            units={units}
            label={words}
          />
          <Button
            kind="quiet"
            icon={isTable ? 'up' : 'down'}
            label={isTable ? 'Hide the figures' : 'Show the figures'}
            isExpanded={isTable}
            onPress={() => setIsTable(!isTable)}
          />
          {isTable ? <TripTable steps={side.steps} units={units} /> : null}
        </>
      ) : null}
      <Text size="note" tint="muted">
        Usual weather, not a forecast. For healthy animals that were not fed before the trip. Not veterinary
        advice.
      </Text>
    </>
  )
}
