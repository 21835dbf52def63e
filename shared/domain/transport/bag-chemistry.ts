import {
  CO2_PER_OXYGEN_G,
  OXYGEN_OF_FILL,
  TAN_PER_OXYGEN_G,
} from '@/shared/domain/transport/bag-equations.facts'
import { oxygenGasGPerL } from '@/shared/domain/transport/gas-density'
import { ammoniaFraction } from '@/shared/domain/water/ammonia-fraction'
import { carbonDioxideOstwald, pHOfCarbonDioxide } from '@/shared/domain/water/carbon-dioxide'
import { oxygenSaturationMgPerL } from '@/shared/domain/water/oxygen-saturation'

export interface BagFill {
  waterL: number
  /** Gas over the water. */
  oxygenL: number
  alkalinityMeqPerL: number
}

export interface BagWater {
  oxygenHadG: number
  oxygenUsedG: number
  /** In balance with the gas above it; water that stands still holds less. */
  oxygenMgPerL: number
  co2MgPerL: number
  tanMgPerL: number
  pH: number
  nh3NMgPerL: number
}

const OXYGEN_OF_AIR = 0.20946

/**
 * Water of a closed bag after its animals used so much oxygen. null outside 0-40 °C, for volumes not above zero, or
 * while nothing has been used yet and no CO2 sets the pH.
 */
export function bagChemistry(fill: BagFill, oxygenUsedG: number, waterC: number): BagWater | null {
  const { waterL, oxygenL, alkalinityMeqPerL } = fill
  const [gasGPerL, ostwald] = [oxygenGasGPerL(waterC), carbonDioxideOstwald(waterC)]
  if (gasGPerL === null || ostwald === null || !(waterL > 0 && oxygenL > 0)) return null
  const oxygenHadG = oxygenL * OXYGEN_OF_FILL * gasGPerL
  const co2MgPerL = (oxygenUsedG * CO2_PER_OXYGEN_G * 1000) / (waterL + oxygenL / ostwald)
  const tanMgPerL = (oxygenUsedG * TAN_PER_OXYGEN_G * 1000) / waterL
  const pH = pHOfCarbonDioxide({ waterC, alkalinityMeqPerL }, co2MgPerL)
  const share = pH === null ? null : ammoniaFraction({ waterC, pH })
  const saturation = oxygenSaturationMgPerL({ waterC, pressureMmHg: 760, salinityPpt: 0 })
  if (pH === null || share === null || saturation === null) return null
  const oxygenLeft = Math.max(0, oxygenHadG - oxygenUsedG) / gasGPerL
  const otherGas =
    oxygenL * (1 - OXYGEN_OF_FILL) + (co2MgPerL / ostwald / 1000 / gasGPerL / CO2_PER_OXYGEN_G) * oxygenL
  const oxygenMgPerL = ((saturation / OXYGEN_OF_AIR) * oxygenLeft) / (oxygenLeft + otherGas)
  return { oxygenHadG, oxygenUsedG, oxygenMgPerL, co2MgPerL, tanMgPerL, pH, nh3NMgPerL: tanMgPerL * share }
}
