import { describe, expect, it } from 'vitest'

import { contactInText } from '@/shared/domain/listings/contact-in-text'

describe('contact data in a seller’s words', () => {
  it.each([
    ['Call (513) 555-0142 after six', 'phone'],
    ['513.555.0142', 'phone'],
    ['5 1 3 5 5 5 0 1 4 2', 'phone'],
    ['+1 513 555 0142', 'phone'],
    ['ann@example.org', 'mail'],
    ['ann at example dot org', 'mail'],
    ['see www.example', 'link'],
    ['pondlife.example.com has more', 'link'],
    ['We are at 1420 Old Mill Road', 'street'],
    ['find me as @anns_fish', 'handle'],
    ['text me first', 'handle'],
    ['Cash only at the gate', 'handle'],
  ])('sees in %j a %s', (text, kind) => expect(contactInText(text)).toContain(kind))

  it.each([
    'Graded twice, 2 to 3 inches, 40 % protein, fed at 7 and 19.',
    'Licence OH-A 1142, tanks of 250 gal, 1,000 fish each.',
    'Hatched 2026-09-02 from our own broodstock; 1000 2000 3000 in stock.',
    'They cost $1.00 each, $89 for 100.',
    'We drive St. Clair fish home in a pail.',
    '',
  ])('lets farm talk pass: %j', (text) => expect(contactInText(text)).toEqual([]))

  it('reads 50,000 characters of anything in no time', () => {
    for (const bit of ['1 ', 'a.', '(513)', 'A ', '@', 'at ']) {
      const startedMs = performance.now()
      contactInText(bit.repeat(25_000))
      expect(performance.now() - startedMs).toBeLessThan(200)
    }
  })
})
