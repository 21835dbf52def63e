import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { loadPlaces } from '@/seed/load-places'
import { openTestServer, type TestServer } from '@/tests/support/server'

let server: TestServer
beforeAll(async () => {
  server = await openTestServer('season')
  await loadPlaces(server.db, { states: ['OH', 'KY', 'IN'] })
})
afterAll(() => server.close())

const ask = (query: string) => server.visitor().get(`/api/v1/season?${query}`)

describe('the season between two places', () => {
  it('has 52 weeks; January is worse for tilapia than for trout, and packs help', async () => {
    const of = async (species: string, packing: string) =>
      (await ask(`from=45202&to=40202&species=${species}&packing=${packing}`)).body as {
        weeks: { verdict: string }[]
        week: number
      }
    const tilapia = await of('nile_tilapia', 'foam-38-overnight')
    expect(tilapia.weeks).toHaveLength(52)
    const january = (weeks: { verdict: string }[]) => weeks.slice(1, 4).map(({ verdict }) => verdict)
    expect(january(tilapia.weeks)).not.toContain('safe')
    const carton = await of('nile_tilapia', 'carton-overnight')
    const safe = ({ weeks }: { weeks: { verdict: string }[] }) =>
      weeks.filter(({ verdict }) => verdict.startsWith('safe')).length
    expect(safe(tilapia)).toBeGreaterThan(safe(carton))
  })

  it('says which field it cannot answer for', async () => {
    const pointers = async (query: string) => {
      const { status, body } = await ask(query)
      return [status, (body as { errors?: { pointer: string }[] }).errors?.map(({ pointer }) => pointer)]
    }
    const good = 'from=45202&to=40202&species=bluegill&packing=carton-overnight'
    expect(await pointers(good.replace('bluegill', 'unicorn'))).toEqual([422, ['query:species']])
    expect(await pointers(good.replace('carton-overnight', 'bare'))).toEqual([422, ['query:packing']])
    expect((await ask(good.replace('45202', '00000'))).status).toBeGreaterThanOrEqual(404)
    expect((await ask('from=45202')).status).toBe(422)
  })
})
