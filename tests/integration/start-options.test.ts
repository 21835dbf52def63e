import { describe, expect, it } from 'vitest'

import { clockOffsetMs, readStartOptions } from '@/scripts/start-options.mjs'

const DAY_MS = 86_400_000

describe('the options of the start command', () => {
  it('runs the clock whole days ahead, so that the time of day stays', () => {
    expect(clockOffsetMs('2027-01-15', new Date('2027-01-10T23:59:00Z'))).toBe(5 * DAY_MS)
    expect(clockOffsetMs('2027-01-15', new Date('2027-01-16T00:00:00Z'))).toBe(-DAY_MS)
  })

  it.each(['2027-02-30', '15.1.2027', '2027-1-5', 'tomorrow'])('refuses "%s" as a day', (date) => {
    expect(() => readStartOptions(['--date', date], {})).toThrow(/real day/)
  })

  it('refuses another date than today in production', () => {
    const production = { NODE_ENV: 'production' }
    expect(() => readStartOptions(['--date', '2027-01-15'], production)).toThrow(/local work only/)
    expect(readStartOptions([], production).clockOffsetMs).toBe(0)
  })

  it('takes the port from the command line before the environment', () => {
    expect(readStartOptions([], {}).port).toBe(8080)
    expect(readStartOptions([], { PORT: '9000' }).port).toBe(9000)
    expect(readStartOptions(['--port', '9001'], { PORT: '9000' }).port).toBe(9001)
    expect(() => readStartOptions(['--port', '70000'], {})).toThrow(/0 .* to 65535/)
  })

  it('names what it knows when it meets an unknown option', () => {
    expect(() => readStartOptions(['--prot', '1'], {})).toThrow(/--port 8080, --date/)
  })
})
