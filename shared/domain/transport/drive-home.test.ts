import { describe, expect, it } from 'vitest'

import { checkDriveHome, driveHoursFor, type DriveHome } from '@/shared/domain/transport/drive-home'
import { homeContainers } from '@/shared/domain/transport/home-containers.facts'
import { animals } from '@/shared/domain/transport/trips-for-tests'
import { rankOf } from '@/shared/domain/transport/verdict'

const december = { minC: -2, maxC: 6, sdMinC: 6, sdMaxC: 6 }
const july = { minC: 20, maxC: 31, sdMinC: 2.5, sdMaxC: 2.5 }
const [pail, cooler] = homeContainers

function drive(change: Partial<DriveHome> = {}): DriveHome {
  if (!pail) throw new Error('the pail has left the list')
  return {
    animals: animals('bluegill', { count: 40, massG: 4 }),
    water: { startC: 21, alkalinityMeqPerL: 2, pH: 7.4 },
    container: pail,
    aeration: 'none',
    ride: 'cabin',
    driveHours: 0.75,
    parkedMinutes: 0,
    departHour: 9,
    origin: december,
    destination: december,
    ...change,
  }
}

const verdictOf = (change: Partial<DriveHome>) => checkDriveHome(drive(change))?.verdict ?? 'unknown'

describe('the drive home', () => {
  it('goes well for a few bluegill in the car, and badly for a pail full of them', () => {
    expect(verdictOf({})).toBe('safe')
    expect(verdictOf({ animals: animals('bluegill', { count: 1500, massG: 4 }) })).toBe('unsafe')
  })

  it('is colder on an open truck in December than in the car', () => {
    const onTruck = { ride: 'outdoor' as const, driveHours: 3 }
    expect(rankOf(verdictOf(onTruck))).toBeGreaterThan(rankOf(verdictOf({ driveHours: 3, aeration: 'air' })))
    const [thin, foam] = [pail, cooler].map((container) =>
      container ? (checkDriveHome(drive({ ...onTruck, container }))?.cold?.coldest?.waterC ?? NaN) : NaN,
    )
    expect(foam).toBeGreaterThan(thin ?? NaN)
  })

  it('gets hot in a parked car in July', () => {
    const way = { origin: july, destination: july, departHour: 13, ride: 'cabin' as const }
    const still = checkDriveHome(drive(way))?.hot?.warmest?.waterC ?? NaN
    const parked = checkDriveHome(drive({ ...way, parkedMinutes: 60 }))?.hot?.warmest?.waterC ?? NaN
    expect(parked).toBeGreaterThan(still + 2)
  })

  it('has no answer without a spread of the weather', () => {
    expect(verdictOf({ driveHours: -1 })).toBe('unknown')
    expect(verdictOf({ driveHours: NaN })).toBe('unknown')
  })
})

describe('hours of the drive', () => {
  it.each([
    [0, 0.25],
    [20, 0.5],
    [72, 1.25],
    [160, 3],
  ])('%i km take %d h', (km, hours) => expect(driveHoursFor(km)).toBe(hours))
})
