import { z } from 'zod'

import { bagLoadGPerL } from '@/shared/domain/transport/bag-loading'
import { boxEquation, boxLossWPerK, boxStepC, boxTimeConstantH } from '@/shared/domain/transport/box'
import { froeseBoxEquation, froeseWaterC } from '@/shared/domain/transport/froese-box'
import { geodesicEquation, geodesicM, sphereM } from '@/shared/domain/geo/geodesic'
import { command, named, type Command } from '@/scripts/calc/command'

const point = z.strictObject({ lat: z.number(), lng: z.number() })
const positive = z.number().positive()
const hours = z.number().min(0).max(96)

const box = z.strictObject({
  lengthCm: positive.max(300),
  widthCm: positive.max(300),
  heightCm: positive.max(300),
  wallMm: positive.max(300),
  conductivity: positive.max(400),
  waterL: positive.max(1000),
  startC: z.number().min(0).max(45),
  ambientC: z.number().min(-60).max(60),
  packW: z.number().min(0).max(500),
  hours,
})

export const transportCommands: Record<string, Command> = {
  'bag-loading': command(
    z.strictObject({
      stage: z.enum(['eggs', 'yolk-sac-fry', 'swim-up-fry', 'fingerling']),
      hours: z.number(),
      temperatureF: z.number(),
    }),
    '1 to 48 hours, water of 32 to 100 °F',
    ({ stage, hours, temperatureF }) => named('gPerL', bagLoadGPerL({ stage, hours, waterF: temperatureF })),
  ),
  'box-cooling': command(
    z.strictObject({
      lengthCm: z.number(),
      widthCm: z.number(),
      volumeMl: z.number(),
      startC: z.number(),
      ambientC: z.number(),
      hours,
    }),
    `${froeseBoxEquation.validFor}, while the water does not freeze`,
    ({ startC, ambientC, hours, ...box }) =>
      named('waterC', froeseWaterC({ box, startC, airC: ambientC, hours })),
  ),
  box: command(box, `${boxEquation.validFor}, while the water does not freeze`, (input) => {
    const uaWPerK = boxLossWPerK({ ...input, conductivityWPerMK: input.conductivity })
    if (uaWPerK === null) return null
    const { startC, ambientC: airC, packW: heatW, waterL, hours } = input
    const waterC = boxStepC(startC, { airC, heatW, waterL, lossWPerK: uaWPerK, hours })
    return waterC < 0 ? null : { waterC, uaWPerK, timeConstantH: boxTimeConstantH(waterL, uaWPerK) }
  }),
  distance: command(z.strictObject({ from: point, to: point }), geodesicEquation.validFor, ({ from, to }) => {
    const [geodesic, sphere] = [geodesicM(from, to), sphereM(from, to)]
    return geodesic === null || sphere === null ? null : { geodesicM: geodesic, sphereM: sphere }
  }),
}
