interface OpenWater {
  waterC: number
  pressureMmHg: number
  salinityPpt: number
}

/**
 * Oxygen at saturation under moist air, mg/L: Benson & Krause as in USGS memo 2011.03.
 * null outside 0-40 °C, 0-40 ppt, 450-850 mmHg.
 */
export function oxygenSaturationMgPerL({ waterC, pressureMmHg, salinityPpt }: OpenWater): number | null {
  const holds =
    waterC >= 0 &&
    waterC <= 40 &&
    salinityPpt >= 0 &&
    salinityPpt <= 40 &&
    pressureMmHg >= 450 &&
    pressureMmHg <= 850
  if (!holds) return null
  const kelvin = waterC + 273.15
  const fresh =
    -139.34411 +
    1.575701e5 / kelvin -
    6.642308e7 / kelvin ** 2 +
    1.2438e10 / kelvin ** 3 -
    8.621949e11 / kelvin ** 4
  const salt = salinityPpt * (0.017674 - 10.754 / kelvin + 2140.7 / kelvin ** 2)
  return Math.exp(fresh - salt) * pressureFactor(waterC, pressureMmHg / 760)
}

function pressureFactor(waterC: number, atm: number): number {
  const kelvin = waterC + 273.15
  const vapourAtm = Math.exp(11.8571 - 3840.7 / kelvin - 216961 / kelvin ** 2)
  const theta = 0.000975 - 1.426e-5 * waterC + 6.436e-8 * waterC ** 2
  return (atm * (1 - vapourAtm / atm) * (1 - theta * atm)) / ((1 - vapourAtm) * (1 - theta))
}
