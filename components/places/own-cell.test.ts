import { afterEach, describe, expect, it, vi } from 'vitest'

import { askDevice } from './ask-device'
import { ownCell } from './own-cell'

vi.mock('./ask-device', () => ({ askDevice: vi.fn() }))
const device = vi.mocked(askDevice)

afterEach(() => device.mockReset())

describe('own cell', () => {
  it('gives two doors of one street the same cell, so that neither can be told from the other', async () => {
    device.mockResolvedValueOnce({ lat: 39.10312, lng: -84.51202 })
    const first = await ownCell()
    device.mockResolvedValueOnce({ lat: 39.10418, lng: -84.51377 })
    expect(await ownCell()).toEqual(first)
    expect(first).toEqual({ cell: '50.2582.1909' })
  })

  it('says why when the owner of the device refuses', async () => {
    device.mockResolvedValueOnce('refused')
    expect(await ownCell()).toEqual({ why: 'refused' })
  })

  it('does not make a cell out of a place that is not on Earth', async () => {
    device.mockResolvedValueOnce({ lat: 120, lng: 0 })
    expect(await ownCell()).toEqual({ why: 'unknown' })
  })
})
