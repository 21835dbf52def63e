import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { loadPlaces } from '@/seed/load-places'
import { findPlaces, type Place } from '@/shared/contracts/places'
import { openTestServer, type TestServer } from '@/tests/support/server'

let server: TestServer
beforeAll(async () => {
  server = await openTestServer('find_places')
  await loadPlaces(server.db, { states: ['OH', 'KY', 'IN'] })
})
afterAll(() => server.close())

async function find(q: string): Promise<Place[]> {
  const { body } = await server.visitor().get('/api/v1/places').query({ q }).expect(200)
  return findPlaces.reply?.parse(body).items ?? []
}
const labels = async (q: string) => (await find(q)).map((place) => place.label)

describe('finding a place', () => {
  it('finds a ZIP code, as a cell and never as a point', async () => {
    const [place] = await find('45202')
    expect(place).toMatchObject({
      label: 'Cincinnati, OH 45202',
      state: 'OH',
      zip: '45202',
      zone: 'America/New_York',
    })
    expect(place?.cell).toMatch(/^50\.\d+\.\d+$/)
    // Centres of 0.05 degree cells end in 25 or 75 thousandths.
    expect(Math.round((place?.lat ?? 0) * 1000) % 50).toBe(25)
    expect(Math.abs(Math.round((place?.lng ?? 0) * 1000) % 50)).toBe(25)
  })

  it('lists ZIP codes by their first three digits', async () => {
    const found = await labels('452')
    expect(found).toHaveLength(8)
    expect(found.every((label) => / 452\d\d$/.test(label))).toBe(true)
  })

  it.each(['Dayton, OH', 'dayton oh', 'DAYTON,OH'])('reads %j as a town and its state', async (q) => {
    expect((await labels(q))[0]).toBe('Dayton, OH')
  })

  it('lists towns by the beginning of their name, the largest first', async () => {
    const found = await labels('Col')
    expect(found[0]).toBe('Columbus, OH')
    expect(found).toContain('Columbus, IN')
  })

  it('knows towns that have a post office and no population figure', async () => {
    const found = await find('Aberdeen, OH')
    expect(found[0]).toMatchObject({ label: 'Aberdeen, OH', state: 'OH' })
  })

  it('names a location cell by the town near it', async () => {
    const [zip] = await find('41011')
    const [cell] = await find(zip?.cell ?? '')
    expect(cell).toMatchObject({ cell: zip?.cell, lat: zip?.lat, lng: zip?.lng })
    expect(cell?.label).toMatch(/^Near .+, (KY|OH)$/)
  })

  it.each(['99999', '12', 'zzzzzz', 'col%', "o'; drop table zip_place; --", '50.0.0'])(
    'finds nothing for %j, and says so quietly',
    async (q) => expect(await find(q)).toEqual([]),
  )

  it('asks for something to look for', async () => {
    const { body } = await server.visitor().get('/api/v1/places').query({ q: ' ' }).expect(422)
    expect(body).toMatchObject({ type: '/problems/fields-invalid', errors: [{ pointer: 'query:q' }] })
  })

  it('loads the same tables twice without doubling them', async () => {
    await loadPlaces(server.db, { states: ['OH', 'KY', 'IN'] })
    expect(await labels('Dayton, OH')).toHaveLength(1)
  })
})
