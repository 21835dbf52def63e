import { useState } from 'react'
import { StyleSheet, View, type LayoutChangeEvent } from 'react-native'

import { LINE_VIEW, planTripLine, type LinePlan } from './trip-line-plan'

import { color, font } from '@/constants/theme'
import type { TripStep } from '@/shared/domain/transport/trip'
import { printTemperature } from '@/shared/units/temperature'
import type { UnitSystem } from '@/shared/units/unit-system'

export interface TripLineProps {
  steps: readonly TripStep[]
  rangeC: readonly [number, number]
  departHour: number
  units: UnitSystem
  /** Spoken instead of the picture: it says the same in words. */
  label: string
}

/** The water's temperature along the way inside the animal's band; nights shaded, the worst moment named. */
export function TripLine({ steps, rangeC, departHour, units, label }: TripLineProps) {
  const [width, setWidth] = useState(0)
  const plan = width > 0 ? planTripLine({ steps, rangeC, departHour, widthPx: width }) : null
  const measure = ({ nativeEvent }: LayoutChangeEvent) => setWidth(Math.round(nativeEvent.layout.width))
  return (
    <View style={styles.frame} onLayout={measure}>
      {plan ? <Drawn plan={plan} width={width} units={units} label={label} /> : null}
    </View>
  )
}

interface DrawnProps extends Pick<TripLineProps, 'units' | 'label'> {
  plan: LinePlan
  width: number
}

function Drawn({ plan, width, units, label }: DrawnProps) {
  const { height, left, right, top, bottom } = LINE_VIEW
  const { worst } = plan
  const isLate = worst.x > width / 2
  return (
    <svg width={width} height={height} role="img" aria-label={label} style={font.body}>
      {plan.nights.map((night) => (
        <rect key={night.x} {...night} y={top} height={height - top - bottom} fill={color.sunk} />
      ))}
      <rect
        x={left}
        width={width - left - right}
        {...plan.band}
        fill="none"
        stroke={color.safe}
        strokeDasharray="6 4"
        strokeWidth={2}
      />
      {plan.degreeMarks.map(({ y, degreesC }) => (
        <text key={degreesC} x={left - 6} y={y + 5} textAnchor="end" fontSize={14} fill={color.ink}>
          {printTemperature(degreesC, units)}
        </text>
      ))}
      {plan.hourMarks.map(({ x, hour }) => (
        <text
          key={hour}
          x={x}
          y={height - 8}
          textAnchor={x > width - 2 * right ? 'end' : 'middle'}
          fontSize={14}
          fill={color.muted}
        >
          {`${hour} h`}
        </text>
      ))}
      <path d={plan.path} fill="none" stroke={color.netting} strokeWidth={3} strokeLinejoin="round" />
      <circle cx={worst.x} cy={worst.y} r={6} fill={color.card} stroke={color.netting} strokeWidth={3} />
      <text
        x={worst.x + (isLate ? -12 : 12)}
        y={worst.y - 10}
        textAnchor={isLate ? 'end' : 'start'}
        fontSize={15}
        fontWeight={600}
        fill={color.ink}
      >
        {printTemperature(worst.waterC, units)}
      </text>
    </svg>
  )
}

const styles = StyleSheet.create({ frame: { minHeight: LINE_VIEW.height } })
