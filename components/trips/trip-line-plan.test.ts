import { describe, expect, it } from 'vitest'

import { LINE_VIEW, planTripLine } from './trip-line-plan'

import type { TripStep } from '@/shared/domain/transport/trip'

const WIDTH_PX = 640

const step = (hour: number, waterC: number): TripStep => ({
  hour,
  waterC,
  airC: 5,
  oxygenMgPerL: null,
  co2MgPerL: null,
  tanMgPerL: null,
  nh3NMgPerL: null,
})

describe('a trip line', () => {
  it('lies within its frame and marks the moment furthest from the middle of the band', () => {
    const plan = planTripLine({
      steps: [step(0, 20), step(6, 14), step(12, 16)],
      rangeC: [12, 24],
      departHour: 8,
      widthPx: WIDTH_PX,
    })
    expect(plan?.worst).toMatchObject({ hour: 6, waterC: 14 })
    const figures = (plan?.path ?? '').match(/[\d.]+/g)?.map(Number) ?? []
    expect(figures).toHaveLength(6)
    for (let at = 0; at < figures.length; at += 2) {
      expect(figures[at]).toBeGreaterThanOrEqual(LINE_VIEW.left)
      expect(figures[at]).toBeLessThanOrEqual(WIDTH_PX - LINE_VIEW.right)
      expect(figures[at + 1]).toBeLessThanOrEqual(LINE_VIEW.height - LINE_VIEW.bottom)
    }
    expect(plan?.band.height).toBeGreaterThan(0)
  })

  it('shades the night between 9 pm and 6 am, also one that has begun', () => {
    const overNight = planTripLine({
      steps: [step(0, 20), step(24, 18)],
      rangeC: [12, 24],
      departHour: 18,
      widthPx: WIDTH_PX,
    })
    const perHour = (WIDTH_PX - LINE_VIEW.left - LINE_VIEW.right) / 24
    expect(overNight?.nights).toHaveLength(1)
    expect(overNight?.nights[0]?.x).toBeCloseTo(LINE_VIEW.left + 3 * perHour, 6)
    expect(overNight?.nights[0]?.width).toBeCloseTo(9 * perHour, 6)
    const before = planTripLine({
      steps: [step(0, 20), step(8, 18)],
      rangeC: [12, 24],
      departHour: 3,
      widthPx: WIDTH_PX,
    })
    expect(before?.nights[0]?.x).toBeCloseTo(LINE_VIEW.left, 6)
  })

  it('draws nothing for no way at all', () => {
    expect(planTripLine({ steps: [], rangeC: [12, 24], departHour: 8, widthPx: WIDTH_PX })).toBeNull()
    expect(
      planTripLine({ steps: [step(0, 20)], rangeC: [12, 24], departHour: 8, widthPx: WIDTH_PX }),
    ).toBeNull()
  })
})
