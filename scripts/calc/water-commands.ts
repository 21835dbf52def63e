import { z } from 'zod'

import { ammoniaCriteria } from '@/shared/domain/water/ammonia-criteria'
import { ammoniaFraction } from '@/shared/domain/water/ammonia-fraction'
import { barometerMmHg } from '@/shared/domain/water/barometer'
import { oxygenSaturationMgPerL } from '@/shared/domain/water/oxygen-saturation'
import { saltForNitriteMgPerL } from '@/shared/domain/water/salt-for-nitrite'
import { waterEquations } from '@/shared/domain/water/water-equations.facts'
import { command, named, type Command } from '@/scripts/calc/command'

const sample = z.strictObject({ temperatureC: z.number(), pH: z.number() })

const air = z
  .strictObject({
    temperatureC: z.number(),
    pressureMmHg: z.number().optional(),
    elevationM: z.number().optional(),
    salinityPpt: z.number().default(0),
  })
  .refine((input) => (input.pressureMmHg === undefined) !== (input.elevationM === undefined), {
    message: 'Give either pressureMmHg or elevationM',
  })

export const waterCommands: Record<string, Command> = {
  'ammonia-fraction': command(sample, waterEquations.ammoniaFraction.validFor, ({ temperatureC, pH }) =>
    named('fraction', ammoniaFraction({ waterC: temperatureC, pH })),
  ),
  'oxygen-saturation': command(air, waterEquations.oxygenSaturation.validFor, (input) => {
    const pressureMmHg = input.pressureMmHg ?? barometerMmHg(input.elevationM ?? NaN)
    if (pressureMmHg === null) return null
    const { temperatureC: waterC, salinityPpt } = input
    return named('mgPerL', oxygenSaturationMgPerL({ waterC, pressureMmHg, salinityPpt }))
  }),
  'ammonia-criteria': command(
    sample.extend({ trout: z.boolean() }),
    waterEquations.ammoniaCriteria.validFor,
    ({ temperatureC, pH, trout }) => ammoniaCriteria({ waterC: temperatureC, pH, trout }),
  ),
  'salt-for-nitrite': command(
    z.strictObject({ nitriteMgNPerL: z.number(), chlorideMgPerL: z.number() }),
    waterEquations.saltForNitrite.validFor,
    (input) => named('saltMgPerL', saltForNitriteMgPerL(input)),
  ),
}
