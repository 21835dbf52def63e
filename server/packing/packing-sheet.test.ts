import { getDocument } from 'pdfjs-dist/legacy/build/pdf.mjs'
import { describe, expect, it } from 'vitest'

import { renderPackingSheet } from '@/server/packing/packing-sheet'
import { usualBags, usualBoxes } from '@/shared/domain/transport/packing.facts'
import { packingSheet } from '@/shared/domain/transport/packing-sheet'
import { planPacking, type PackingPlan, type PackingTask } from '@/shared/domain/transport/plan-packing'
import { animals, tripOf } from '@/shared/domain/transport/trips-for-tests'

interface Page {
  text: string
  width: number
  height: number
}

/** Words of each page, with the spaces that line ends stand for. */
async function pagesOf(bytes: Uint8Array): Promise<Page[]> {
  const file = await getDocument({ data: bytes, verbosity: 0 }).promise
  return Promise.all(
    Array.from({ length: file.numPages }, async (_, at) => {
      const page = await file.getPage(at + 1)
      const { items } = await page.getTextContent()
      const { width, height } = page.getViewport({ scale: 1 })
      const text = items.map((item) => ('str' in item ? item.str : '')).join(' ')
      return { text: text.replace(/\s+/g, ' '), width, height }
    }),
  )
}

function taskOf(changes: Partial<PackingTask> = {}): PackingTask {
  const { container: _, ...trip } = tripOf({
    animals: animals('nile_tilapia', { count: 137, massG: 1.3, fastedHours: 24 }),
    water: { startC: 25, alkalinityMeqPerL: 2, pH: 7.5 },
    legs: [{ hours: 22, airC: 12 }],
  })
  return { ...trip, standsStill: true, boxSizes: usualBoxes, bagSizes: usualBags, ...changes }
}

function planOf(task: PackingTask): PackingPlan {
  const { plan } = planPacking(task)
  if (!plan) throw new Error('This task should have a plan.')
  return plan
}

const numbers = (text: string) => text.match(/\d+(?:\.\d+)?/g) ?? []

describe('the packing sheet', () => {
  it('prints every figure of the plan on one Letter page', async () => {
    const task = taskOf()
    const plan = planOf(task)
    const [page, ...more] = await pagesOf(await renderPackingSheet(packingSheet(task, plan)))
    expect(more).toEqual([])
    expect(page).toMatchObject({ width: 612, height: 792 })
    const { box, boxes, bagsPerBox, animalsPerBag, bag, packs, priceCents, answer } = plan
    const figures = [
      task.animals.count,
      task.animals.massG,
      task.water.startC,
      task.animals.species.fastHours,
      boxes,
      bagsPerBox,
      boxes * bagsPerBox,
      animalsPerBag,
      Number((animalsPerBag * task.animals.massG).toFixed(1)),
      bag.waterL,
      bag.oxygenL,
      box.box.lengthCm,
      box.box.widthCm,
      box.box.heightCm,
      box.box.wallMm,
      packs.heat?.count,
      answer.hours,
      Number(answer.cold?.coldest?.waterC.toFixed(1)),
      Number(answer.hot?.warmest?.waterC.toFixed(1)),
    ]
    const printed = new Set(numbers(page?.text ?? '').map(Number))
    for (const figure of figures) expect(printed, `${figure} in ${page?.text}`).toContain(figure)
    expect(page?.text).toContain(`$${(priceCents / 100).toFixed(2)}`)
  })

  it('loses no number of its own words, and says what to do on arrival', async () => {
    const task = taskOf()
    const sheet = packingSheet(task, planOf(task))
    const text = (await pagesOf(await renderPackingSheet(sheet))).map((page) => page.text).join(' ')
    const said = [sheet.title, ...sheet.sections.flatMap(({ lines }) => lines), ...sheet.label]
    const printed = numbers(text)
    for (const number of said.flatMap(numbers)) expect(printed).toContain(number)
    for (const word of ['LIVE ANIMALS', 'For whoever receives them', 'heat pack', 'do not pour'])
      expect(text).toContain(word)
  })

  it('names no packs where none are needed', async () => {
    const task = taskOf({ legs: [{ hours: 6, airC: 25 }] })
    const [page] = await pagesOf(await renderPackingSheet(packingSheet(task, planOf(task))))
    expect(page?.text).toContain('No heat packs and no cold packs.')
    expect(page?.text).not.toContain('pencil holes')
  })
})
