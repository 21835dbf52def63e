import { checkStock, checkWindows, type Wrong } from '@/shared/contracts/check-lot'
import type { MediaBody } from '@/shared/contracts/media-lot'
import { findMedia } from '@/shared/domain/media/find-media'

/** Rules between the answers of a listing of media. */
export function checkMedia(lot: MediaBody, wrong: Wrong): void {
  const material = findMedia(lot.material)
  if (lot.material === 'other' && !lot.materialWords) {
    wrong(['materialWords'], 'What is it? Name the material in a few words.')
  }
  if (material?.hasGrain) {
    if (lot.grainLoMm === undefined) wrong(['grainLoMm'], 'The finest grain, like 8 mm or 1/4 in.')
    if (lot.grainHiMm === undefined) wrong(['grainHiMm'], 'The coarsest grain, like 16 mm or 5/8 in.')
    if (lot.rinsed === undefined) wrong(['rinsed'], 'Is it rinsed? Yes or no.')
    if (!lot.vinegarTest) {
      wrong(['vinegarTest'], 'Drop a handful in vinegar: does it fizz? "Not done" is an answer.')
    }
  }
  if ((lot.grainHiMm ?? Infinity) < (lot.grainLoMm ?? 0)) {
    wrong(['grainHiMm'], 'The coarsest grain cannot be finer than the finest.')
  }
  if (material?.mayCarryWorms && !lot.heatTreated) {
    wrong(['heatTreated'], 'Was it heat treated, so that no worm or egg lives in it? "Unknown" is an answer.')
  }
  if (lot.used === 'used' && !lot.usedWords) {
    wrong(['usedWords'], 'Used in what? Say what lived in it, and any salt, copper or medicine.')
  }
  checkStock(lot, wrong)
  checkWindows(lot, wrong)
}
