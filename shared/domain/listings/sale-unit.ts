import { gramsPerOunce, poundsFromG, printMass } from '@/shared/units/mass'
import { printCount } from '@/shared/units/count'
import { roundTo } from '@/shared/units/round-to'
import { printDryVolume } from '@/shared/units/volume'

/**
 * What one of the whole units of a listing is. Stock, orders and tiers count these units; one listing has one.
 * `netG` is what is in it, without box or root ball. `pack`: animals counted.
 */
export type SaleUnit =
  | { kind: 'each' }
  | { kind: 'head' }
  | { kind: 'bunch'; netG?: number | undefined }
  | { kind: 'weight'; netG: number }
  | { kind: 'dry-pint' }
  | { kind: 'pack'; count: number }
  | { kind: 'volume'; litres: number; weightKg: number }

export type SaleUnitKind = SaleUnit['kind']

/** A mass as a label states it, finer than a screen rounds: '13.5 oz (383 g)', '2.25 lb (1.02 kg)'. */
export function printBothMasses(massG: number): string {
  const pounds = poundsFromG(massG)
  const us = pounds >= 1 ? `${figure(pounds, 0.01)} lb` : `${figure(massG / gramsPerOunce, 0.1)} oz`
  const metric =
    massG >= 1000 ? `${figure(massG / 1000, 0.01)} kg` : `${figure(massG, massG >= 10 ? 1 : 0.1)} g`
  return `${us} (${metric})`
}

const figure = (value: number, step: number) => roundTo(value, step).toLocaleString('en-US')

/** One unit in words: 'head', 'bunch, 4 oz (113 g) net', '250 worms', '50 L (1.8 cu ft), about 31 lb (14 kg)'. */
export function printSaleUnit(unit: SaleUnit, animals = 'worms'): string {
  switch (unit.kind) {
    case 'each':
    case 'head':
      return unit.kind
    case 'bunch':
      return unit.netG === undefined ? 'bunch' : `bunch, ${printBothMasses(unit.netG)} net`
    case 'weight':
      return `${printBothMasses(unit.netG)} net`
    case 'dry-pint':
      return 'dry pint'
    case 'pack':
      return `${printCount(unit.count)} ${animals}`
    case 'volume':
      return `${printDryVolume(unit.litres, 'metric')} (${printDryVolume(unit.litres, 'us')}), about ${printMass(unit.weightKg * 1000, 'us')} (${printMass(unit.weightKg * 1000, 'metric')})`
  }
}
