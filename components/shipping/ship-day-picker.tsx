import { useRef } from 'react'
import { Pressable, StyleSheet, View } from 'react-native'

import { DayVerdict } from './day-verdict'
import { wayWords } from './ship-day-words'

import { CheckMark } from '@/components/ui/check-mark'
import { FieldError } from '@/components/ui/field-frame'
import { Text } from '@/components/ui/text'
import { color, space, touchPx } from '@/constants/theme'
import type { ShipDayOffer } from '@/shared/contracts/shipments'

interface Props {
  days: readonly ShipDayOffer[]
  value: string
  onChange: (shipDay: string) => void
  error?: string
  /** The days shown are those of the question before. */
  isBusy?: boolean
}

const id = 'ship-day'
const steps: Record<string, number> = { ArrowDown: 1, ArrowRight: 1, ArrowUp: -1, ArrowLeft: -1 }

/** Days in order, each with its verdict. One that is not safe stands there with its reason and cannot be chosen. */
export function ShipDayPicker({ days, value, onChange, error, isBusy = false }: Props) {
  const dots = useRef(new Map<string, View>())
  const open = days.filter(({ verdict }) => verdict === 'safe')
  const reached = open.some(({ shipDay }) => shipDay === value) ? value : open[0]?.shipDay
  function step(from: string, by: number) {
    const at = open.findIndex(({ shipDay }) => shipDay === from)
    const next = open[(at + by + open.length) % open.length]
    if (!next) return
    onChange(next.shipDay)
    dots.current.get(next.shipDay)?.focus()
  }
  return (
    <View style={styles.frame}>
      <Text face="strong" nativeID={`${id}-label`}>
        Ship day
      </Text>
      <View
        role="radiogroup"
        nativeID={id}
        tabIndex={-1}
        aria-labelledby={`${id}-label`}
        aria-describedby={error ? `${id}-error` : undefined}
        aria-invalid={Boolean(error)}
        aria-busy={isBusy}
        style={isBusy ? styles.busy : null}
      >
        {days.map((day, index) => {
          const isOff = day.verdict !== 'safe' || isBusy
          return (
            <Pressable
              key={day.shipDay}
              ref={(view) => {
                if (view) dots.current.set(day.shipDay, view)
                else dots.current.delete(day.shipDay)
              }}
              role="radio"
              aria-checked={day.shipDay === value}
              aria-disabled={isOff}
              tabIndex={day.shipDay === reached ? 0 : -1}
              onPress={isOff ? undefined : () => onChange(day.shipDay)}
              onKeyDown={(event) => {
                const { key } = event.nativeEvent
                const by = steps[key]
                if (isOff || (by === undefined && key !== ' ')) return
                event.preventDefault()
                if (by === undefined) onChange(day.shipDay)
                else step(day.shipDay, by)
              }}
              style={[styles.row, index > 0 ? styles.ruled : null]}
            >
              {day.verdict === 'safe' ? (
                <CheckMark shape="dot" isOn={day.shipDay === value} />
              ) : (
                <View style={styles.noDot} />
              )}
              <View style={styles.words}>
                <Text face="strong" tint={day.verdict === 'safe' ? 'ink' : 'muted'}>
                  {wayWords(day)}
                </Text>
                <DayVerdict day={day} mostReasons={2} />
              </View>
            </Pressable>
          )
        })}
      </View>
      {error ? <FieldError id={`${id}-error`} error={error} /> : null}
    </View>
  )
}

const styles = StyleSheet.create({
  frame: { gap: space.xs },
  busy: { opacity: 0.6 },
  row: {
    flexDirection: 'row',
    gap: space.md,
    minHeight: touchPx,
    alignItems: 'flex-start',
    paddingVertical: space.md,
  },
  ruled: { borderTopWidth: 1, borderTopColor: color.line },
  noDot: { width: 24, height: 24 },
  words: { flex: 1, minWidth: 0, gap: 2 },
})
