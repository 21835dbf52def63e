import { describe, expect, it } from 'vitest'

import { reaches, reachOf, widerReach } from './reach'

describe('how far Find looks', () => {
  it('never cuts a chosen mile short', () => {
    expect(reaches('us').map((one) => one.km)).toEqual([17, 41, 81, 161, 403])
  })

  it('reads a link of somebody with other units as the closest choice', () => {
    expect(reachOf(40, 'us').label).toBe('25 mi')
    expect(reachOf(161, 'metric').label).toBe('160 km')
  })

  it('offers the next wider circle until there is none', () => {
    expect(widerReach(41, 'us')?.label).toBe('50 mi')
    expect(widerReach(161, 'metric')?.label).toBe('400 km')
    expect(widerReach(403, 'us')).toBeUndefined()
  })
})
