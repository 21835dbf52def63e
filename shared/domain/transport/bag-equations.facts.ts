import type { Equation } from '@/shared/domain/equation'

/** How the water of a closed bag changes, for the page that shows it. */
export const bagChemistryEquation: Equation = {
  text: 'CO2 made = 1.375 · O2 used; dissolved = CO2 / (Vw + Vg/L); TAN = 0.10 g N per g O2; oxygen had = gas · 0.9 · density',
  validFor: 'fasted animals in a closed bag filled to 90 % oxygen, 0 to 40 °C, shaken by the road',
  sourceKeys: [
    'weiss-1974',
    'plummer-busenberg-1982',
    'emerson-1975',
    'benson-krause-1984',
    'memory',
    'house-rule',
  ],
}

/** Share of oxygen in the gas of a filled bag: a little air stays behind. House rule. */
export const OXYGEN_OF_FILL = 0.9
/** g CO2 per g O2 when both count alike by volume. */
export const CO2_PER_OXYGEN_G = 44.01 / 32
/** g of ammonia nitrogen per g O2 of fasted fish, upper end (from memory). */
export const TAN_PER_OXYGEN_G = 0.1
/** Water of a farm whose alkalinity nobody stated: 100 mg/L CaCO3. House rule. */
export const USUAL_ALKALINITY_MEQ_PER_L = 2
