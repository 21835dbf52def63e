import { parseArgs } from 'node:util'

import { shapes, type Shape } from '@/tests/bench/make-query'

export interface BenchFlags {
  listings: number
  shapes: Shape[]
  queries: number
  seed: number
  plantFault: boolean
  plantSlowness: boolean
  /** Names of those asked beside ours. */
  peers: string[]
}

export const PEERS: readonly string[] = ['SELECT 1', 'plain scan', 'SPATIAL INDEX']

const isShape = (text: string): text is Shape => Object.hasOwn(shapes, text)

/** Throws with a sentence when a flag makes no sense. */
export function readFlags(args: string[]): BenchFlags {
  const { values } = parseArgs({
    args,
    options: {
      n: { type: 'string', default: '10000' },
      shapes: { type: 'string', default: Object.keys(shapes).join(',') },
      queries: { type: 'string', default: '100' },
      seed: { type: 'string', default: '42' },
      'plant-fault': { type: 'boolean', default: false },
      'plant-slowness': { type: 'boolean', default: false },
      peers: { type: 'string', default: PEERS.join(',') },
    },
  })
  const number = (name: 'n' | 'queries' | 'seed') => {
    const value = Number(values[name])
    if (!Number.isInteger(value) || value < 1)
      throw new Error(`--${name} needs a whole number, not "${values[name]}"`)
    return value
  }
  const asked = values.shapes.split(',')
  const strange = asked.filter((shape) => !isShape(shape))
  if (strange.length > 0)
    throw new Error(`--shapes knows ${Object.keys(shapes).join(', ')}, not ${strange.join(', ')}`)
  const unknown = values.peers.split(',').filter((name) => name !== 'none' && !PEERS.includes(name))
  if (unknown.length > 0)
    throw new Error(`--peers knows ${PEERS.join(', ')} and none, not ${unknown.join(', ')}`)
  return {
    listings: number('n'),
    shapes: asked.filter(isShape),
    queries: number('queries'),
    seed: number('seed'),
    plantFault: values['plant-fault'],
    plantSlowness: values['plant-slowness'],
    peers: values.peers.split(',').filter((name) => name !== 'none'),
  }
}
