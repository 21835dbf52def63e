import { describe, expect, it } from 'vitest'

import { ammoniaCriteria } from '@/shared/domain/water/ammonia-criteria'
import { barometerMmHg } from '@/shared/domain/water/barometer'
import {
  carbonDioxideMgPerL,
  carbonDioxideOstwald,
  pHOfCarbonDioxide,
} from '@/shared/domain/water/carbon-dioxide'
import { oxygenSaturationMgPerL } from '@/shared/domain/water/oxygen-saturation'
import { saltForNitriteMgPerL } from '@/shared/domain/water/salt-for-nitrite'

const sea = { waterC: 20, pressureMmHg: 760, salinityPpt: 0 }

describe('water figures outside their range', () => {
  it('are not answered', () => {
    for (const wrong of [{ waterC: -1 }, { waterC: 41 }, { salinityPpt: 41 }, { pressureMmHg: 30 }]) {
      expect(oxygenSaturationMgPerL({ ...sea, ...wrong })).toBeNull()
    }
    expect(barometerMmHg(9000)).toBeNull()
    expect(ammoniaCriteria({ waterC: 31, pH: 7, trout: true })).toBeNull()
    expect(ammoniaCriteria({ waterC: 20, pH: 9.5, trout: true })).toBeNull()
    expect(carbonDioxideOstwald(60)).toBeNull()
    expect(pHOfCarbonDioxide({ waterC: 20, alkalinityMeqPerL: 2 }, 0)).toBeNull()
    expect(carbonDioxideMgPerL({ waterC: 20, alkalinityMeqPerL: 0 }, 7)).toBeNull()
    expect(saltForNitriteMgPerL({ nitriteMgNPerL: -1, chlorideMgPerL: 0 })).toBeNull()
  })
})

describe('water figures', () => {
  it('read CO2 and pH back and forth', () => {
    const water = { waterC: 18, alkalinityMeqPerL: 1.5 }
    expect(pHOfCarbonDioxide(water, carbonDioxideMgPerL(water, 6.8) ?? 0)).toBeCloseTo(6.8, 10)
  })

  it('add no salt where there is chloride enough', () => {
    expect(saltForNitriteMgPerL({ nitriteMgNPerL: 1, chlorideMgPerL: 100 })).toBe(0)
  })

  it('hold less oxygen when warm, salty or high up', () => {
    const full = oxygenSaturationMgPerL(sea) ?? 0
    for (const less of [{ waterC: 25 }, { salinityPpt: 5 }, { pressureMmHg: 700 }]) {
      expect(oxygenSaturationMgPerL({ ...sea, ...less })).toBeLessThan(full)
    }
  })

  it('allow less ammonia where trout live in cold water, the same in warm', () => {
    const cold = { waterC: 10, pH: 7.5 }
    expect(ammoniaCriteria({ ...cold, trout: true })?.acuteMgTanPerL).toBeLessThan(
      ammoniaCriteria({ ...cold, trout: false })?.acuteMgTanPerL ?? 0,
    )
    expect(ammoniaCriteria({ waterC: 25, pH: 7.5, trout: true })).toEqual(
      ammoniaCriteria({ waterC: 25, pH: 7.5, trout: false }),
    )
  })
})
