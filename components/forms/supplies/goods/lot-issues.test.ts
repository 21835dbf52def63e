import { describe, expect, it } from 'vitest'

import { lotIssues } from './lot-issues'

import { clay, redWigglers } from '@/shared/domain/listings/lots-for-tests'
import { lettuce } from '@/shared/contracts/lettuce-for-tests'
import { changeAt, issuesOf, type Path } from '@/shared/contracts/lot-issues-for-tests'
import { mediaBody } from '@/shared/contracts/media-lot'
import { produceBody } from '@/shared/contracts/produce-lot'
import { wormBody } from '@/shared/contracts/worm-lot'

import type { ListingDraft } from '@/shared/contracts/listings'
import type { z } from 'zod'

const lots: ['produce' | 'worms' | 'media', z.ZodType, object][] = [
  ['produce', produceBody, lettuce],
  ['worms', wormBody, redWigglers],
  ['media', mediaBody, clay],
]
/** The form fills these in by itself; nobody can leave them out. */
const formsOwn = ['category', 'photoId', 'hasRuler']

function pathsOf(value: unknown, at: Path = []): Path[] {
  if (typeof value !== 'object' || value === null) return [at]
  return Object.entries(value).flatMap(([key, one]) =>
    pathsOf(one, [...at, Array.isArray(value) ? Number(key) : key]),
  )
}
/** The first steps that two complaints must share: a form has one place for a group that is missing whole. */
const fieldsOf = (issues: Record<string, string>) =>
  new Set(Object.keys(issues).map((path) => path.split('.')[0]))

describe.each(lots)('what the form says of %s before it is sent', (kind, contract, lot) => {
  const paths = pathsOf(lot).filter((path) => !formsOwn.includes(String(path.at(-1))))
  const own = (draft: unknown) =>
    Object.fromEntries(
      lotIssues(kind, draft as ListingDraft).map(({ path, message }) => [path.join('.'), message]),
    )

  it('is nothing when all is answered', () => expect(own(lot)).toEqual({}))

  it('names the field of each missing answer, as the contract does', () => {
    expect(paths.length).toBeGreaterThan(20)
    for (const path of paths) {
      const draft = changeAt(lot, path, undefined)
      const [ours, theirs] = [fieldsOf(own(draft)), fieldsOf(issuesOf(contract, draft))]
      expect([path.join('.'), ours.has(String(path[0]))]).toEqual([
        path.join('.'),
        theirs.has(String(path[0])),
      ])
      expect([...ours].filter((one) => !theirs.has(one))).toEqual([])
    }
  })

  it('names the field of each unreadable answer, and none that the contract takes', () => {
    for (const path of paths) {
      for (const junk of [-1, 1e9, 'x'.repeat(5000)]) {
        const draft = changeAt(lot, path, junk)
        const [field, theirs, ours] = [
          String(path[0]),
          fieldsOf(issuesOf(contract, draft)),
          fieldsOf(own(draft)),
        ]
        expect([path.join('.'), junk, ours.has(field)]).toEqual([path.join('.'), junk, theirs.has(field)])
        expect([...ours].filter((one) => !theirs.has(one))).toEqual([])
      }
    }
  })

  it('asks in the words of the contract', () => {
    const differing = paths.flatMap((path) => {
      const draft = changeAt(lot, path, undefined)
      const [name, theirs] = [path.join('.'), issuesOf(contract, draft)]
      return theirs[name] && own(draft)[name] !== theirs[name] ? [[name, own(draft)[name], theirs[name]]] : []
    })
    expect(differing).toEqual([])
  })
})

it('asks until when basil from the fridge is sold, whatever else is still open', () => {
  const basil = changeAt({ ...lettuce, cropId: 'basil', saleUnit: { kind: 'bunch' } }, ['handling'], {
    touchesSystemWater: 'no',
    heldC: 3,
  })
  const told = lotIssues('produce', basil as ListingDraft).map(({ path }) => path.join('.'))
  expect(told).toEqual(['handling.rinsedInDrinkingWater', 'handling.coldAtPickup', 'sellBy'])
})
