import { mkdtempSync, readdirSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'

import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'

import { openWeatherBook } from './weather-book'

const cold = { where: null, from: '2027-01-15', until: '2027-01-16', minC: -12, maxC: -3 }

describe('what was set', () => {
  let folder: string
  beforeEach(() => {
    folder = mkdtempSync(join(tmpdir(), 'practice-weather-'))
  })
  afterEach(() => {
    vi.restoreAllMocks()
    rmSync(folder, { recursive: true, force: true })
  })

  it('outlives a restart', () => {
    const file = join(folder, 'new', 'weather.json')
    const book = openWeatherBook(file)
    const first = book.add(cold)
    const second = book.add({ ...cold, maxC: 0 })
    book.remove(first.id)
    book.setMode('refuses')
    const again = openWeatherBook(file)
    expect(again.rules()).toEqual([second])
    expect(again.mode()).toBe('refuses')
    expect(readdirSync(join(folder, 'new'))).toEqual(['weather.json'])
    again.clear()
    expect(openWeatherBook(file).rules()).toEqual([])
  })

  it('is begun anew, and said so, when the file cannot be read', () => {
    const said = vi.spyOn(process.stderr, 'write').mockReturnValue(true)
    const file = join(folder, 'weather.json')
    writeFileSync(file, '{"rules": [')
    expect(openWeatherBook(file).rules()).toEqual([])
    expect(said).toHaveBeenCalledOnce()
  })
})
