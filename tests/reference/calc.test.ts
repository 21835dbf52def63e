import { spawnSync } from 'node:child_process'
import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'

const box = { lengthCm: 40, widthCm: 30, heightCm: 25, wallMm: 38, conductivityWPerMK: 0.036 }
const bluegill = {
  species: 'hybrid_bluegill',
  count: 20,
  massG: 2,
  fastedHours: 24,
  startC: 20,
  container: {
    kind: 'bags',
    boxes: 1,
    bagsPerBox: 1,
    waterLPerBag: 10,
    oxygenLPerBag: 10,
    isDoubled: true,
    standsStill: false,
    box,
    packs: { heat: null, cold: null, hasAirHoles: false },
  },
  legs: [{ hours: 24, airC: 8 }],
}

const asked: readonly (readonly [name: string, input: object, reply: object])[] = [
  ['ammonia-fraction', { temperatureC: 24, pH: 8 }, { fraction: expect.closeTo(0.0502, 4) }],
  ['oxygen-saturation', { temperatureC: 20, elevationM: 1609 }, { mgPerL: expect.closeTo(7.45, 2) }],
  [
    'oxygen-saturation',
    { temperatureC: 20, pressureMmHg: 760, salinityPpt: 5 },
    { mgPerL: expect.closeTo(8.828, 3) },
  ],
  [
    'ammonia-criteria',
    { temperatureC: 20, pH: 7, trout: true },
    { acuteMgTanPerL: expect.closeTo(16.76, 2), chronicMgTanPerL: expect.closeTo(1.887, 3) },
  ],
  [
    'oxygen-demand',
    { model: 'crayfish', massG: 1, temperatureC: 0 },
    { mgPerKgHour: expect.closeTo(56.25, 2) },
  ],
  ['standard-weight', { species: 'nile_tilapia', lengthMm: 100 }, { massG: expect.closeTo(20.67, 2) }],
  ['bag-loading', { stage: 'swim-up-fry', hours: 36, temperatureF: 65 }, { gPerL: expect.closeTo(35.9, 0) }],
  [
    'box-cooling',
    { lengthCm: 40, widthCm: 30, volumeMl: 8000, startC: 25, ambientC: 5, hours: 12 },
    { waterC: expect.closeTo(16.54, 2) },
  ],
  ['growth', { massG: 10, tgcX1000: 1.8, temperatureC: 12, days: 100 }, { massG: expect.closeTo(80.31, 2) }],
  [
    'distance',
    { from: { lat: 0, lng: 0 }, to: { lat: 0, lng: 1 } },
    { geodesicM: expect.closeTo(111_319.491, 3) },
  ],
  ['climate', { lat: 44.984, lng: -93.27, date: '2027-07-15' }, { minC: expect.closeTo(18.3, 1) }],
  ['trip', bluegill, { verdict: 'safe', cold: { coldest: { waterC: expect.closeTo(11.76, 1) } } }],
]
const wrong = [
  '{"name":"ammonia-fraction","input":{"temperatureC":70,"pH":8}}',
  '{"name":"ammonia-fraction","input":{"temperatureC":"warm","pH":8}}',
  '{"name":"oxygen-saturation","input":{"temperatureC":20}}',
  '{"name":"bag-loading","input":{"stage":"fingerling","hours":60,"temperatureF":65}}',
  '{"name":"standard-weight","input":{"species":"goldfish","lengthMm":100}}',
  '{"name":"fortune","input":{}}',
  'not json',
]

const calc = (args: readonly string[], input = '') =>
  spawnSync(process.execPath, ['--import', 'tsx', 'scripts/calc.ts', ...args], { input, encoding: 'utf8' })

describe('the calc command', () => {
  it('answers a line each, and a wrong one with a sentence', () => {
    const lines = [...asked.map(([name, input]) => JSON.stringify({ name, input })), ...wrong]
    const replies: unknown[] = calc(['--lines'], lines.join('\n'))
      .stdout.trim()
      .split('\n')
      .map((line) => JSON.parse(line) as unknown)
    expect(replies).toHaveLength(lines.length)
    asked.forEach(([, , reply], at) => expect(replies[at]).toMatchObject(reply))
    for (const reply of replies.slice(asked.length))
      expect(reply).toEqual({ error: expect.stringMatching(/\.$/) })
  }, 60_000)

  it('answers the example of DEVELOPERS.md', () => {
    const [, example] = /calc -- trip '({.*})'/.exec(readFileSync('DEVELOPERS.md', 'utf8')) ?? []
    const { status, stdout } = calc(['trip', example ?? ''])
    expect(status).toBe(0)
    expect(JSON.parse(stdout)).toMatchObject({ hours: 18, cold: { coldest: {} }, hot: { warmest: {} } })
  }, 60_000)

  it('leaves with 2 and one sentence on bad input', () => {
    const { status, stdout, stderr } = calc(['growth', '{"massG":-1}'])
    expect({ status, stdout }).toEqual({ status: 2, stdout: '' })
    expect(stderr.trim()).toMatch(/^tgcX1000: .*\.$/)
  }, 60_000)
})
