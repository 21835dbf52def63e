import { describe, expect, it } from 'vitest'

import { blankPaper, namedPapers, paperErrors, paperRows } from './papers'

const permit = {
  ...{ kind: 'Import permit', number: '7-12', issuer: 'State agency' },
  ...{ issuedOn: '2027-03-01', expiresOn: '2027-09-01' },
}

describe('papers for the way', () => {
  it('begins with what is needed, by name, without asking twice', () => {
    expect(paperRows([permit], ['Import permit', 'Health certificate'])).toEqual([
      permit,
      blankPaper('Health certificate'),
    ])
  })

  it('sends only what is filled in, and blames only what is begun', () => {
    const rows = [{ ...permit, number: ' 7-12 ' }, blankPaper('Health certificate')]
    expect(paperErrors(rows)).toEqual([])
    expect(namedPapers(rows)).toEqual([permit])
    expect(paperErrors([{ ...blankPaper('Health certificate'), number: '4' }])).toHaveLength(3)
  })

  it('refuses a paper that ran out before it was issued', () => {
    expect(paperErrors([{ ...permit, expiresOn: '2027-02-01' }])).toEqual([
      { fieldId: 'paper-0-expiresOn', message: 'It cannot expire before it was issued.' },
    ])
  })
})
