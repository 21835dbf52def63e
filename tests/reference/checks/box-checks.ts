import { boxLossWPerK, boxStepC, boxTimeConstantH } from '@/shared/domain/transport/box'
import {
  froeseHoursTo,
  froeseRatePerHour,
  froeseWaterC,
  wettedSurfaceCm2,
} from '@/shared/domain/transport/froese-box'
import { waterAfterIceC } from '@/shared/domain/transport/ice'
import { checksOf, type Check } from './check'

const foam = { lengthCm: 40, widthCm: 30, volumeMl: 8000 }
const froese = (within: number) => ({ from: 'Froese 1998, computed', within, because: 'printed digits' })
const box = (wallMm: number) => ({
  lengthCm: 40,
  widthCm: 30,
  heightCm: 25,
  wallMm,
  conductivityWPerMK: 0.036,
})
const loss = (wallMm: number) => boxLossWPerK(box(wallMm)) ?? NaN
const lumped = (within: number) => ({ from: 'lumped box model, computed', within, because: 'printed digits' })
const one = (what: string, published: number) => [[what, what, published]] as const

const stand = ({
  startC,
  airC,
  heatW,
  hours,
}: {
  startC: number
  airC: number
  heatW: number
  hours: number
}) => boxStepC(startC, { airC, heatW, hours, waterL: 10, lossWPerK: loss(38) })

const coolings = [
  { hours: 12, heatW: 0, published: 13.19 },
  { hours: 24, heatW: 0, published: 8.27 },
  { hours: 48, heatW: 0, published: 3.96 },
  { hours: 12, heatW: 3, published: 15.54 },
  { hours: 24, heatW: 3, published: 11.93 },
  { hours: 48, heatW: 3, published: 8.77 },
]
const winterDays = [
  { who: 'bluegill from 20 °C', startC: 20, heatW: 0, published: 11.76 },
  { who: 'tilapia from 24 °C', startC: 24, heatW: 0, published: 13.01 },
  { who: 'tilapia from 24 °C with 9 W', startC: 24, heatW: 9, published: 24.0 },
]

export const boxChecks: readonly Check[] = [
  ...checksOf(froese(0.05), one('wetted surface, cm²', 3333.3), () => wettedSurfaceCm2(foam)),
  ...checksOf(froese(0.000001), one('rate per hour', 0.045833), () => froeseRatePerHour(foam)),
  ...checksOf(froese(0.01), one('time constant, h', 21.82), () => 1 / (froeseRatePerHour(foam) ?? NaN)),
  ...checksOf(
    froese(0.01),
    [
      ['foam box after 6 h', 6, 20.19],
      ['foam box after 12 h', 12, 16.54],
      ['foam box after 24 h', 24, 11.66],
    ],
    (hours) => froeseWaterC({ box: foam, startC: 25, airC: 5, hours }),
  ),
  ...checksOf(froese(0.01), one('hours to 18 °C', 9.4), () =>
    froeseHoursTo({ box: foam, startC: 25, airC: 5 }, 18),
  ),
  ...checksOf(
    lumped(0.0006),
    [
      ['loss, 25 mm wall, W/K', 25, 0.725],
      ['loss, 38 mm wall, W/K', 38, 0.562],
    ],
    loss,
  ),
  ...checksOf(lumped(0.0001), one('loss, 38 mm wall, W/K, four digits', 0.5623), () => loss(38)),
  ...checksOf(
    lumped(0.006),
    [
      ['time constant, 25 mm, h', 25, 16.03],
      ['time constant, 38 mm, h', 38, 20.68],
    ],
    (wallMm) => boxTimeConstantH(10, loss(wallMm)),
  ),
  ...checksOf(
    lumped(0.006),
    [
      ['°C held by 3 W, 25 mm', 25, 4.14],
      ['°C held by 3 W, 38 mm', 38, 5.34],
    ],
    (wallMm) => 3 / loss(wallMm),
  ),
  ...coolings.map(({ published, ...how }) => ({
    what: `38 mm box, ${how.hours} h at 2 °C, ${how.heatW} W`,
    published,
    ours: () => stand({ startC: 22, airC: 2, ...how }),
    ...lumped(0.01),
  })),
  ...winterDays.map(({ who, published, ...how }) => ({
    what: `24 h at 8 °C, ${who}`,
    published,
    ours: () => stand({ airC: 8, hours: 24, ...how }),
    ...lumped(0.01),
  })),
  ...checksOf(
    { from: 'LSU AgCenter rule, by the energy balance', within: 0.1, because: 'stated with the rule' },
    one('½ lb of ice per gal from 24 °C', 18.13),
    () => waterAfterIceC(3.785411784, 0.22679618, 24),
  ),
  ...checksOf(
    {
      from: 'LSU AgCenter rule, by the energy balance',
      within: 0.2,
      because: '0.1 °C of the stated tolerance is 0.18 °F',
    },
    one('the same, °F lost', 10.56),
    () => (24 - (waterAfterIceC(3.785411784, 0.22679618, 24) ?? NaN)) * 1.8,
  ),
  ...checksOf(
    { from: 'energy balance, computed', within: 0.01, because: 'two printed decimals' },
    one('1 kg of ice in 20 L of 28 °C', 22.87),
    () => waterAfterIceC(20, 1, 28),
  ),
]
