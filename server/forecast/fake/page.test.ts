import { describe, expect, it } from 'vitest'

import { weatherPage } from './page'

const shown = { rules: [], mode: 'normal' as const, typed: { unit: 'F' }, errors: {} }
const cold = { where: null, from: '2027-01-15', until: '2027-01-16', minC: -12, maxC: -3 }

describe('the page of the practice weather', () => {
  it('says plainly that all of it is invented', () => {
    expect(weatherPage(shown)).toContain('All of this is invented.')
    expect(weatherPage(shown)).toContain('Nothing is set: it is mild everywhere')
  })

  it('lists the latest first, in both units, each with a button of its own', () => {
    const where = { lat: 39.96, lng: -83, withinKm: 80.4672 }
    const page = weatherPage({
      ...shown,
      rules: [
        { id: 'a', ...cold },
        { id: 'b', ...cold, where, maxC: 0 },
      ],
    })
    expect(page).toContain('10 °F (-12 °C) to 27 °F (-3 °C)')
    expect(page).toContain('aria-label="Remove: Within 50 miles of 39.96, -83, 2027-01-15 to 2027-01-16"')
    expect(page.indexOf('/rules/b/remove')).toBeLessThan(page.indexOf('/rules/a/remove'))
  })

  it('gives a label to every field, keeps what was typed and marks what is wrong', () => {
    const typed = { low: '"><script>', unit: 'C' }
    const page = weatherPage({ ...shown, typed, errors: { low: 'Type a number.' } })
    const fields = [...page.matchAll(/<input\s+id="(\w+)"/g)].map(([, id]) => id)
    expect(fields).toEqual(['lat', 'lng', 'miles', 'from', 'until', 'low', 'high'])
    for (const id of fields) expect(page).toContain(`<label for="${id}">`)
    expect(page).toContain('value="&quot;&gt;&lt;script&gt;"')
    expect(page).toContain('id="low-wrong">Type a number.')
    expect(page.match(/aria-invalid="true"/g)).toHaveLength(1)
  })
})
