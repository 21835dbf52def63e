import { describe, expect, it } from 'vitest'

import { readJsonRule, readTypedRule, whereWords } from './read-rule'

const typed = {
  where: 'everywhere',
  from: '2027-01-15',
  until: '2027-01-16',
  low: '14',
  high: '32',
  unit: 'F',
}

describe('weather typed into the page', () => {
  it('is read in Fahrenheit or Celsius', () => {
    expect(readTypedRule(typed)).toEqual({
      rule: { where: null, from: '2027-01-15', until: '2027-01-16', minC: -10, maxC: 0 },
    })
    expect(readTypedRule({ ...typed, unit: 'C' })).toMatchObject({ rule: { minC: 14, maxC: 32 } })
  })

  it('holds within miles of a point', () => {
    const read = readTypedRule({ ...typed, where: 'near', lat: '39.96', lng: '-83', miles: '50' })
    expect(read).toMatchObject({ rule: { where: { lat: 39.96, lng: -83, withinKm: 80.4672 } } })
    if ('rule' in read) expect(whereWords(read.rule)).toBe('Within 50 miles of 39.96, -83')
  })

  it.each([
    [{ from: '' }, 'from'],
    [{ until: '2027-01-14' }, 'until'],
    [{ until: 'tomorrow' }, 'until'],
    [{ low: '' }, 'low'],
    [{ low: 'cold' }, 'low'],
    [{ high: '13' }, 'high'],
    [{ high: '141' }, 'high'],
    [{ where: 'near', lat: '91', lng: '0', miles: '5' }, 'lat'],
    [{ where: 'near', lat: '9', lng: '', miles: '5' }, 'lng'],
    [{ where: 'near', lat: '9', lng: '9', miles: '0' }, 'miles'],
  ])('names the field at fault: %o', (change, name) => {
    const read = readTypedRule({ ...typed, ...change })
    expect('errors' in read && Object.keys(read.errors)).toEqual([name])
  })
})

describe('the same as JSON', () => {
  it('takes kilometres and Celsius', () => {
    const where = { lat: 33.45, lng: -112.07, withinKm: 30 }
    const rule = { where, from: '2027-07-01', until: '2027-07-04', minC: 29, maxC: 44 }
    expect(readJsonRule(rule)).toEqual({ rule })
    expect(readJsonRule({ ...rule, where: undefined })).toEqual({ rule: { ...rule, where: null } })
  })

  it.each([[null], [{}], [[]], ['cold'], [{ from: '2027-07-01', until: '2027-07-04', minC: {}, maxC: 4 }]])(
    'refuses %o',
    (body) => expect(readJsonRule(body)).toHaveProperty('errors'),
  )
})
