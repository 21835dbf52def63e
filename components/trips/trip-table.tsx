import { DataTable } from '@/components/ui/data-table'
import { Text } from '@/components/ui/text'
import { printFigure } from '@/components/tools/print-figure'
import type { TripStep } from '@/shared/domain/transport/trip'
import { printTemperature } from '@/shared/units/temperature'
import type { UnitSystem } from '@/shared/units/unit-system'

const MOST_ROWS = 13

/** Evenly chosen steps, the first and the last among them. */
export function someSteps(steps: readonly TripStep[], most = MOST_ROWS): TripStep[] {
  if (steps.length <= most) return [...steps]
  return Array.from(
    { length: most },
    (_, at) => steps[Math.round((at * (steps.length - 1)) / (most - 1))] as TripStep,
  )
}

const figure = (value: number | null) => (
  <Text isFigures>{value === null ? 'moved by air' : printFigure(value)}</Text>
)

/** The trip line as figures, for readers and for print. */
export function TripTable({ steps, units }: { steps: readonly TripStep[]; units: UnitSystem }) {
  return (
    <DataTable
      label="The way, hour by hour"
      rows={someSteps(steps)}
      rowKey={({ hour }) => String(hour)}
      columns={[
        {
          key: 'hour',
          title: 'Hours',
          cell: ({ hour }) => <Text isFigures>{printFigure(hour, 2)}</Text>,
          isNumeric: true,
        },
        {
          key: 'air',
          title: 'Air',
          minWidthPx: 76,
          cell: ({ airC }) => <Text isFigures>{printTemperature(airC, units)}</Text>,
          isNumeric: true,
        },
        {
          key: 'water',
          title: 'Water',
          minWidthPx: 76,
          cell: ({ waterC }) => <Text isFigures>{printTemperature(waterC, units)}</Text>,
          isNumeric: true,
        },
        {
          key: 'oxygen',
          title: 'Oxygen, mg/L',
          cell: ({ oxygenMgPerL }) => figure(oxygenMgPerL),
          isNumeric: true,
        },
        {
          key: 'nh3',
          title: 'Toxic ammonia, mg N/L',
          cell: ({ nh3NMgPerL }) => (
            <Text isFigures>{nh3NMgPerL === null ? 'unknown' : printFigure(nh3NMgPerL, 2)}</Text>
          ),
          isNumeric: true,
        },
      ]}
    />
  )
}
