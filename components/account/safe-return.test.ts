import { describe, expect, it } from 'vitest'

import { safeReturn } from './safe-return'

describe('the way back after signing in', () => {
  it('leads to the page the member came from, with its question', () => {
    expect(safeReturn('/listings/abc/reserve?count=20')).toBe('/listings/abc/reserve?count=20')
  })

  it.each([
    'https://elsewhere.example/',
    '//elsewhere.example/',
    '/\\elsewhere.example',
    '/..//elsewhere.example/',
    '/.//elsewhere.example/',
    '/listings/../..//elsewhere.example/',
    '/%2e%2e//elsewhere.example/',
    '\\\\elsewhere.example',
    'javascript:alert(1)',
    '/\t/elsewhere.example',
    'listings/abc',
    '',
    undefined,
  ])('never leaves the site: %j', (given) => {
    expect(safeReturn(given)).toBe('/')
  })

  it('takes the first of several', () => {
    expect(safeReturn(['/orders', 'https://elsewhere.example'])).toBe('/orders')
  })
})
