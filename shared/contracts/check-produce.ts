import { checkStock, checkWindows, type Wrong } from '@/shared/contracts/check-lot'
import type { ProduceBody } from '@/shared/contracts/produce-lot'
import { dayNumberOf } from '@/shared/domain/calendar/day-number'
import { tierFor } from '@/shared/domain/money/tier-price'
import { SMALL_TOTAL_CENTS } from '@/shared/domain/orders/pay-in-full'
import type { Crop } from '@/shared/domain/produce/crop'
import { judgeStanding } from '@/shared/domain/produce/farm-standing'
import { findCrop } from '@/shared/domain/produce/find-crop'
import { holdingFault } from '@/shared/domain/produce/judge-holding'
import { methodFault } from '@/shared/domain/produce/judge-method'
import { judgeWords } from '@/shared/domain/produce/judge-words'
import { isLotCodeOf, readLotCode } from '@/shared/domain/produce/lot-code'
import { sellBy } from '@/shared/domain/produce/sell-by'

/**
 * Rules between the answers of a produce listing. What needs today's date or papers runs where it is submitted. They
 * are asked even when a text had the wrong shape, so none may rest on a day being one.
 */
export function checkProduce(lot: ProduceBody, wrong: Wrong): void {
  const crop = findCrop(lot.cropId)
  if (!crop) wrong(['cropId'], unknownCropSaying(lot.cropId))
  else checkCrop(lot, crop, wrong)
  if (lot.lotCode !== undefined && readLotCode(lot.lotCode) && !isLotCodeOf(lot.lotCode, lot.harvest.day)) {
    wrong(['lotCode'], 'The lot code names another day than the harvest. Leave it empty and we write one.')
  }
  checkFarm(lot, wrong)
  checkSaid(lot, crop, wrong)
  checkDeposit(lot, wrong)
  checkStock(lot, wrong)
  checkWindows(lot, wrong)
}

/** Sprouts are no oversight of the list. */
function unknownCropSaying(typed: string): string {
  const found = judgeWords(typed, { organic: null, form: 'whole', taxonId: null })
  return (
    found.find(({ rule }) => rule === 'sprouts')?.saying ??
    'Pick the crop from the list. Is yours missing? Ask us to add it.'
  )
}

function checkCrop(lot: ProduceBody, crop: Crop, wrong: Wrong): void {
  const { form, harvest, handling } = lot
  const hasDay = dayNumberOf(harvest.day) !== null
  const method = methodFault(crop, lot.saleUnit)
  if (method) wrong(['saleUnit'], method)
  const holding = holdingFault({ crop, form, heldC: handling.heldC })
  if (holding) wrong(['handling', 'heldC'], holding)
  if (form === 'cut-mixed-or-washed' && crop.isLeafyGreen && !handling.coldAtPickup) {
    wrong(['handling', 'coldAtPickup'], 'Cut leafy greens are handed over from a cooler or fridge.')
  }
  const reckoned = sellBy({ crop, form, harvestDay: harvest.day, heldC: handling.heldC })
  if (lot.sellBy === undefined && hasDay && !reckoned) {
    wrong(['sellBy'], 'Nobody published how long it keeps like this. Say until which day you sell it.')
  }
  if (lot.sellBy !== undefined && lot.sellBy < harvest.day) {
    wrong(['sellBy'], 'The last day of sale cannot be before the harvest.')
  }
  if (lot.sellBy !== undefined && reckoned && lot.sellBy > reckoned.day) {
    wrong(['sellBy'], `Kept like this it is good until ${reckoned.day}. Choose that day or an earlier one.`)
  }
  const lastDay = lot.sellBy ?? reckoned?.day
  lot.windows.forEach(({ day }, at) => {
    if (day < harvest.day) wrong(['windows', at, 'day'], 'This pickup is before the harvest.')
    if (lastDay !== undefined && day > lastDay) {
      wrong(['windows', at, 'day'], `This pickup is after the last day of sale, ${lastDay}.`)
    }
  })
}

function checkFarm(lot: ProduceBody, wrong: Wrong): void {
  const { fault } = judgeStanding(lot.standing, lot.farm ?? null)
  if (fault && !lot.farm) wrong(['farm'], fault)
  if (lot.standing !== 'qualified-exempt' && lot.farm) {
    wrong(['farm'], 'Your address would be public without need: leave it out, or choose "qualified exempt".')
  }
}

function checkSaid(lot: ProduceBody, crop: Crop | null, wrong: Wrong): void {
  if (lot.organic === 'certified' && !lot.organicCertifier) {
    wrong(['organicCertifier'], 'Who certified you? Name the certifier, or take the claim back.')
  }
  const declared = { organic: lot.organic ?? null, form: lot.form, taxonId: crop?.taxonId ?? null }
  const said: [(string | number)[], string | undefined][] = [
    [['variety'], lot.variety],
    [['growing'], lot.growing],
    [['words'], lot.words],
    ...lot.photos.map((photo, at): [(string | number)[], string | undefined] => [
      ['photos', at, 'caption'],
      photo.caption,
    ]),
  ]
  for (const [path, text] of said)
    for (const { effect, saying } of judgeWords(text ?? '', declared))
      if (effect === 'stop') wrong(path, saying)
}

/** Two charges cost more than they protect: what is small and spoils is paid at once. */
function checkDeposit(lot: ProduceBody, wrong: Wrong): void {
  const tier = tierFor(lot.tiers, lot.minOrder)
  if (tier && tier.unitCents * lot.minOrder < SMALL_TOTAL_CENTS && lot.depositPct < 100) {
    wrong(['depositPct'], 'Produce orders under $40 are paid in full: set the deposit to 100 %.')
  }
}
