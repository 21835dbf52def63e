import { describe, expect, it } from 'vitest'
import {
  celsiusFromF,
  parseTemperatureC,
  printBothSpans,
  printBothTemperatures,
  printTemperature,
} from '@/shared/units/temperature'

describe('temperatures', () => {
  it.each([
    ['68', 'us', 20],
    ['68 F', 'metric', 20],
    ['20 °C', 'us', 20],
    ['20', 'metric', 20],
    ['-4 F', 'us', -20],
    ['−20 c', 'us', -20],
    ['77 degrees fahrenheit', 'metric', 25],
  ] as const)('reads %s (%s)', (typed, units, degreesC) => {
    expect(parseTemperatureC(typed, units)).toBeCloseTo(degreesC, 9)
  })

  it.each(['', 'warm', '68 K', '900', '68 68', '--3'])('does not read %j', (typed) => {
    expect(parseTemperatureC(typed, 'us')).toBeNull()
  })

  it('prints whole degrees Fahrenheit and half degrees Celsius', () => {
    expect(printTemperature(20, 'us')).toBe('68 °F')
    expect(printTemperature(8.8, 'metric')).toBe('9 °C')
    expect(printTemperature(-0.1, 'metric')).toBe('0 °C')
    expect(printTemperature(-10, 'us')).toBe('14 °F')
    expect(printBothTemperatures(20, 'us')).toBe('68 °F (20 °C)')
    expect(printBothTemperatures(celsiusFromF(50), 'metric')).toBe('10 °C (50 °F)')
  })

  it('are told apart in both scales, without the 32 of a reading', () => {
    expect(printBothSpans(5, 'us')).toBe('9 °F (5 °C)')
    expect(printBothSpans(-2.8, 'metric')).toBe('3 °C (5 °F)')
    expect(printBothSpans(0, 'us')).toBe('0 °F (0 °C)')
  })
})
