import { describe, expect, it } from 'vitest'

import { readAsk } from './read-ask'

const NOW = new Date('2027-01-15T15:00:00Z')
const query = (change: Record<string, string> = {}) =>
  new URLSearchParams({ latitude: '40.71', longitude: '-74.01', format: 'flatbuffers', ...change })

describe('an ask for practice weather', () => {
  it('may name several places, each with the zone it lies in', () => {
    const two = query({ latitude: '40.71,33.45', longitude: '-74.01,-112.07', timezone: 'auto' })
    expect(readAsk(two, NOW).places).toEqual([
      { lat: 40.71, lng: -74.01, zone: 'America/New_York', offsetS: -18_000 },
      { lat: 33.45, lng: -112.07, zone: 'America/Phoenix', offsetS: -25_200 },
    ])
  })

  it('gets the offset in force while it is asked, whatever the days are', () => {
    const summer = query({ timezone: 'auto', start_date: '2027-07-01', end_date: '2027-07-02' })
    expect(readAsk(summer, NOW).places[0]?.offsetS).toBe(-18_000)
    expect(readAsk(summer, new Date('2027-07-01T00:00:00Z')).places[0]?.offsetS).toBe(-14_400)
    expect(readAsk(query(), NOW).places[0]).toMatchObject({ zone: 'GMT', offsetS: 0 })
  })

  it('gets seven days from today unless it names others, and at most sixteen', () => {
    expect(readAsk(query(), NOW).days).toHaveLength(7)
    expect(readAsk(query(), NOW).days[0]).toBe('2027-01-15')
    const long = query({ start_date: '2027-02-20', end_date: '2027-03-07' })
    expect(readAsk(long, NOW).days).toHaveLength(16)
  })

  it.each([
    [{ format: 'json' }, 'flatbuffers'],
    [{ latitude: '91' }, 'latitude'],
    [{ latitude: 'north' }, 'latitude'],
    [{ latitude: '40,41' }, 'places alike'],
    [{ latitude: '' }, 'places alike'],
    [{ start_date: '2027-02-30' }, 'start_date'],
    [{ start_date: '2027-01-15', end_date: '2027-01-14' }, 'end_date'],
    [{ start_date: '2027-01-15', end_date: '2027-01-31' }, '16 days'],
    [{ daily: 'temperature_2m_min,snow' }, 'snow'],
    [{ timezone: 'Mars/Olympus' }, 'Mars/Olympus'],
  ])('is refused with a reason: %o', (change, reason) => {
    expect(() => readAsk(query(change), NOW)).toThrow(reason)
  })
})
