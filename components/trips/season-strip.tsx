import { useState } from 'react'
import { StyleSheet, View, type LayoutChangeEvent } from 'react-native'

import { seasonSummary, seasonWords } from './season-words'

import { shortDay } from '@/components/listings/shipping-words'
import { Text } from '@/components/ui/text'
import { webElement } from '@/components/ui/web-element'
import { color, space, type ColorName } from '@/constants/theme'
import type { SeasonVerdict } from '@/shared/domain/season/season-at'

export interface SeasonStripProps {
  /** 52 in the order shown. */
  weeks: readonly SeasonVerdict[]
  /** The Monday of each, YYYY-MM-DD. */
  mondays: readonly string[]
  /** Place of this week among them, from 1. */
  thisWeek: number
}

const HEIGHT_PX = 44
const inks: Record<SeasonVerdict, ColorName> = {
  safe: 'safe',
  'safe-with-packs': 'netting',
  'too-cold': 'frost',
  'too-hot': 'warm',
  unknown: 'edge',
}

/** The year in 52 cells, each with its pattern; tap or arrow keys read one out. */
export function SeasonStrip({ weeks, mondays, thisWeek }: SeasonStripProps) {
  const [chosen, setChosen] = useState(thisWeek)
  const [widthPx, setWidthPx] = useState(0)
  const verdict = weeks[chosen - 1] ?? 'unknown'
  const words = `Week of ${shortDay(mondays[chosen - 1] ?? '')}: ${seasonWords[verdict].word}`
  const move = (to: number) => setChosen(Math.min(weeks.length, Math.max(1, to)))
  const keys: Record<string, number> = {
    ArrowLeft: chosen - 1,
    ArrowRight: chosen + 1,
    PageDown: chosen - 4,
    PageUp: chosen + 4,
    Home: 1,
    End: weeks.length,
  }
  return (
    <View
      style={styles.frame}
      onLayout={({ nativeEvent }: LayoutChangeEvent) => setWidthPx(nativeEvent.layout.width)}
    >
      {webElement('div', {
        role: 'slider',
        tabIndex: 0,
        'aria-label': 'Week of the year',
        'aria-valuemin': 1,
        'aria-valuemax': weeks.length,
        'aria-valuenow': chosen,
        'aria-valuetext': words,
        style: styles.strip,
        onKeyDown: (event: KeyboardEvent) => {
          const to = keys[event.key]
          if (to === undefined) return
          event.preventDefault()
          move(to)
        },
        onClick: (event: MouseEvent) => {
          const box = (event.currentTarget as HTMLElement).getBoundingClientRect()
          move(1 + Math.floor(((event.clientX - box.left) / box.width) * weeks.length))
        },
        children: <Cells weeks={weeks} widthPx={widthPx} chosen={chosen} thisWeek={thisWeek} />,
      })}
      <Text face="strong" aria-live="polite">
        {chosen === thisWeek ? `${words} (this week)` : words}
      </Text>
      <Text size="note" tint="muted">
        {seasonSummary(weeks, mondays)}
      </Text>
    </View>
  )
}

interface CellsProps {
  weeks: readonly SeasonVerdict[]
  widthPx: number
  chosen: number
  thisWeek: number
}

function Cells({ weeks, widthPx, chosen, thisWeek }: CellsProps) {
  const cell = widthPx / weeks.length
  return (
    <svg width={widthPx} height={HEIGHT_PX} aria-hidden focusable={false}>
      <defs>
        <pattern id="season-too-cold" width={6} height={6} patternUnits="userSpaceOnUse">
          <circle cx={3} cy={3} r={1.6} fill={color.frost} />
        </pattern>
        <pattern id="season-too-hot" width={6} height={6} patternUnits="userSpaceOnUse">
          <path d="M0 6L6 0" stroke={color.warm} strokeWidth={2} />
        </pattern>
        <pattern id="season-safe-with-packs" width={6} height={6} patternUnits="userSpaceOnUse">
          <path d="M0 3H6" stroke={color.netting} strokeWidth={3} />
        </pattern>
      </defs>
      {weeks.map((verdict, at) => (
        <rect
          key={at}
          x={at * cell + 0.5}
          y={6}
          width={Math.max(0, cell - 1)}
          height={HEIGHT_PX - 12}
          fill={verdict === 'safe' ? color.safe : verdict === 'unknown' ? 'none' : `url(#season-${verdict})`}
          stroke={color[inks[verdict]]}
          strokeWidth={1}
        />
      ))}
      <path d={`M${(thisWeek - 0.5) * cell - 5} 0h10l-5 6z`} fill={color.ink} />
      <rect
        x={(chosen - 1) * cell - 1}
        y={4}
        width={cell + 2}
        height={HEIGHT_PX - 8}
        fill="none"
        stroke={color.ink}
        strokeWidth={3}
      />
    </svg>
  )
}

const styles = StyleSheet.create({
  frame: { gap: space.sm },
  strip: { height: HEIGHT_PX, cursor: 'pointer' },
})
