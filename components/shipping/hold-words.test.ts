import { describe, expect, it } from 'vitest'

import { isWhyShort, proposedWords, silenceWords, startedWords } from './hold-words'

const zone = 'America/New_York'
const until = '2027-05-10T13:00:00Z'

describe('a weather hold in words', () => {
  it('says what silence does, by the rule the server has decided', () => {
    expect(silenceWords({ silenceMoves: true, until, zone, isBuyer: true })).toBe(
      'If you say nothing until Mon, May 10, 9:00 AM EDT, the new day stands.',
    )
    expect(silenceWords({ silenceMoves: false, until, zone, isBuyer: false })).toBe(
      'If the buyer says nothing until Mon, May 10, 9:00 AM EDT, the order ends and everything paid goes back.',
    )
    expect(silenceWords({ silenceMoves: false, until: null, zone, isBuyer: true })).toMatch(
      /^If you say nothing, the order ends/,
    )
  })

  it('proposes a ship day, a pickup window, or nothing', () => {
    const times = { startsAt: '2027-05-17T13:00:00Z', endsAt: '2027-05-17T14:00:00Z' }
    expect(proposedWords({ proposed: { ...times, shipDay: '2027-05-17' } }, zone)).toBe(
      'to leave on Mon, May 17',
    )
    expect(proposedWords({ proposed: { ...times, windowId: 'w' } }, zone)).toBe(
      'Mon, May 17, 9:00 AM to 10:00 AM EDT',
    )
    expect(proposedWords({}, zone)).toBeNull()
  })

  it('says who stopped it, and wants a reason worth reading', () => {
    expect(startedWords({ startedBy: 'system' }, true)).toMatch(/^We looked/)
    expect(startedWords({ startedBy: 'seller' }, true)).toBe('You held it for weather.')
    expect(startedWords({ startedBy: 'seller' }, false)).toBe('The seller held it for weather.')
    expect(isWhyShort(' ice ')).toBe(true)
    expect(isWhyShort('ice storm')).toBe(false)
  })
})
