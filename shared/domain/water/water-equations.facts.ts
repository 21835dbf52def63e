import type { Equation } from '@/shared/domain/equation'

type WaterEquation =
  | 'ammoniaFraction'
  | 'oxygenSaturation'
  | 'barometer'
  | 'ammoniaCriteria'
  | 'carbonDioxide'
  | 'bagPh'
  | 'saltForNitrite'

export const waterEquations: Readonly<Record<WaterEquation, Equation>> = {
  ammoniaFraction: {
    text: 'pKa = 0.09018 + 2729.92 / (T + 273.15); fraction = 1 / (1 + 10^(pKa − pH))',
    validFor: 'fresh water, 0 to 50 °C',
    sourceKeys: ['emerson-1975', 'ifas-fa16', 'trussell-1972'],
  },
  oxygenSaturation: {
    text: 'Benson and Krause, with salinity S and pressure P; vapour pressure and θ as in the memo',
    validFor: '0 to 40 °C, 0 to 40 ppt, 450 to 850 mmHg',
    sourceKeys: ['benson-krause-1984'],
  },
  barometer: {
    text: 'P = (1 − 2.25577e-5 · h)^5.25588 atm, the standard atmosphere',
    validFor: 'from 400 m below the sea to 4,000 m; weather moves it by about 3 %',
    sourceKeys: ['memory'],
  },
  ammoniaCriteria: {
    text: 'One-hour criterion (CMC) and thirty-day criterion (CCC) as total ammonia nitrogen',
    validFor: 'pH 6.5 to 9.0, 0 to 30 °C; they protect mussels too, so they are strict for a tank',
    sourceKeys: ['epa-2013-ammonia'],
  },
  carbonDioxide: {
    text: 'ln K0 = −58.0931 + 90.5069 (100/K) + 22.2940 ln(K/100), mol/kg/atm',
    validFor: 'fresh water, 0 to 40 °C',
    sourceKeys: ['weiss-1974'],
  },
  bagPh: {
    text: 'pH = pK1 + log10(alkalinity · 44,010 / CO2)',
    validFor: 'fresh water, 0 to 50 °C, pH below 8.3',
    sourceKeys: ['plummer-busenberg-1982'],
  },
  saltForNitrite: {
    text: 'NaCl = (10 · NO2 − chloride present) / 0.607, all mg/L, NO2 = 3.284 · NO2-N',
    validFor: 'catfish and other chloride-sensitive fish; no protection for largemouth bass',
    sourceKeys: ['srac-462', 'tomasso-1986'],
  },
}
