import { gramsPerPound, printMass } from '@/shared/units/mass'
import { printCount } from '@/shared/units/count'
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

/** In both systems, since it stands on labels: '8 oz (227 g)', '2 lb (907 g)'. */
export function printBothMasses(massG: number): string {
  return `${printMass(massG, 'us')} (${printMass(massG, 'metric')})`
}

/** One unit in words: 'head', 'bunch, 4 oz (113 g) net', '250 worms', '50 L (1.8 cu ft), about 14 kg (31 lb)'. */
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
    case 'volume': {
      const volume = `${printDryVolume(unit.litres, 'metric')} (${printDryVolume(unit.litres, 'us')})`
      const massG = unit.weightKg * 1000
      // A bag below a pound is told in ounces by printMass; both orders read well.
      const [first, second] =
        massG >= gramsPerPound ? (['metric', 'us'] as const) : (['us', 'metric'] as const)
      return `${volume}, about ${printMass(massG, first)} (${printMass(massG, second)})`
    }
  }
}
