import { describe, expect, it } from 'vitest'

import { listingCautions } from './listing-cautions'

import type { GateVerdict } from '@/shared/contracts/rules'

const ids = (gate?: Partial<GateVerdict>) =>
  listingCautions(gate as GateVerdict | undefined).map(({ id }) => id)

describe('cautions beside a listing', () => {
  it('warns of release, meetings and advice even before a place is known', () => {
    expect(ids()).toEqual(['G-1', 'G-12', 'G-13'])
  })

  it('adds what the legal gate says, each once and in order', () => {
    const said = ['G-13', 'G-5', 'G-1', 'G-3'].map((id) => ({ id, text: `text of ${id}` }))
    expect(ids({ cautions: said })).toEqual(['G-1', 'G-3', 'G-5', 'G-12', 'G-13'])
    expect(listingCautions({ cautions: said } as GateVerdict)[0]?.text).toBe('text of G-1')
  })

  it('puts our own rule about a state before everything else', () => {
    expect(ids({ cautions: [{ id: 'apart', text: 'Not to Alaska.' }] })).toEqual([
      'apart',
      'G-1',
      'G-12',
      'G-13',
    ])
  })
})
