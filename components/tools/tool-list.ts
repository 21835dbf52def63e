import { ammonia } from './sums/ammonia'
import { bagLoading } from './sums/bag-loading'
import { boxCooling } from './sums/box-cooling'
import { growth } from './sums/growth'
import { lengthWeight } from './sums/length-weight'
import { nitriteSalt } from './sums/nitrite-salt'
import { oxygen } from './sums/oxygen'
import { oxygenDemand } from './sums/oxygen-demand'

import type { Tool } from './tool'

/** All calculators, in the order of their list. */
export const toolList: readonly Tool[] = [
  ammonia,
  oxygen,
  nitriteSalt,
  oxygenDemand,
  lengthWeight,
  growth,
  bagLoading,
  boxCooling,
]

export const findTool = (id: string): Tool | undefined => toolList.find((tool) => tool.id === id)
