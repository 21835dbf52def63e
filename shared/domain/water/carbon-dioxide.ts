const GAS_CONSTANT_L_ATM = 0.082057
const CO2_MG_PER_MOL = 44_010
const FRESH_WATER_KG_PER_L = 0.998

/** Solubility of CO2, mol/kg/atm, fresh water: Weiss 1974 (constants from memory). null outside 0-40 °C. */
export function carbonDioxideSolubility(waterC: number): number | null {
  if (!(waterC >= 0 && waterC <= 40)) return null
  const kelvin = waterC + 273.15
  return Math.exp(-58.0931 + 90.5069 * (100 / kelvin) + 22.294 * Math.log(kelvin / 100))
}

/** Litres of CO2 gas that dissolve in a litre of water under the same pressure (Ostwald). null outside 0-40 °C. */
export function carbonDioxideOstwald(waterC: number): number | null {
  const solubility = carbonDioxideSolubility(waterC)
  return solubility && solubility * FRESH_WATER_KG_PER_L * GAS_CONSTANT_L_ATM * (waterC + 273.15)
}

/** First acid constant of carbonic acid: Plummer & Busenberg 1982 (constants from memory). null outside 0-50 °C. */
export function carbonicPK1(waterC: number): number | null {
  if (!(waterC >= 0 && waterC <= 50)) return null
  const kelvin = waterC + 273.15
  const logK1 =
    -356.3094 -
    0.06091964 * kelvin +
    21834.37 / kelvin +
    126.8339 * Math.log10(kelvin) -
    1684915 / kelvin ** 2
  return -logK1
}

interface CarbonicWater {
  waterC: number
  alkalinityMeqPerL: number
}

/** pH that free CO2 (mg/L) leaves in water of this alkalinity. null where the figures do not allow it. */
export function pHOfCarbonDioxide(water: CarbonicWater, co2MgPerL: number): number | null {
  const pK1 = carbonicPK1(water.waterC)
  if (pK1 === null || !(co2MgPerL > 0 && water.alkalinityMeqPerL > 0)) return null
  return pK1 + Math.log10(((water.alkalinityMeqPerL / 1000) * CO2_MG_PER_MOL) / co2MgPerL)
}

/** Free CO2, mg/L, in water of this alkalinity and pH. null where the figures do not allow it or above pH 9. */
export function carbonDioxideMgPerL(water: CarbonicWater, pH: number): number | null {
  const pK1 = carbonicPK1(water.waterC)
  if (pK1 === null || !(pH >= 3 && pH <= 9 && water.alkalinityMeqPerL > 0)) return null
  return ((water.alkalinityMeqPerL / 1000) * CO2_MG_PER_MOL) / 10 ** (pH - pK1)
}
