import { checkStock, checkWindows, type Wrong } from '@/shared/contracts/check-lot'
import type { WormBody } from '@/shared/contracts/worm-lot'
import { judgeWormLot } from '@/shared/domain/worms/judge-worm-lot'

/** Rules between the answers of a listing of worms. */
export function checkWorms(lot: WormBody, wrong: Wrong): void {
  const judged = judgeWormLot({
    taxonId: lot.taxonId,
    names: lot.strain ?? '',
    words: lot.words,
    raisedInUs: lot.raisedInUs,
    lotChecked: lot.lotChecked,
  })
  if (judged.effect === 'refuse') {
    for (const { field, saying } of judged.reasons)
      if (field === 'taxonId' || field === 'strain') wrong([field], saying)
  }
  if (lot.saleUnit.kind === 'pack' && !lot.countMethod) {
    wrong(
      ['countMethod'],
      'Sold by count: say how you count, by hand, by a weighed sample or by displacement.',
    )
  }
  if (lot.grading === 'sized' && (lot.sizeLoMm === undefined || lot.sizeHiMm === undefined)) {
    const missing = lot.sizeLoMm === undefined ? 'sizeLoMm' : 'sizeHiMm'
    wrong([missing], 'Sorted by size: from how long to how long are they?')
  }
  if ((lot.sizeHiMm ?? Infinity) < (lot.sizeLoMm ?? 0)) {
    wrong(['sizeHiMm'], 'The longest cannot be shorter than the shortest.')
  }
  if (lot.origin === 'bought-in' && lot.raisedInUs && !lot.originState) {
    wrong(['originState'], 'From which state?')
  }
  checkStock(lot, wrong)
  checkWindows(lot, wrong)
}
